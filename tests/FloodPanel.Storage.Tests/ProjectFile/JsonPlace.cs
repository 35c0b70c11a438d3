using System.Globalization;
using System.Text.Json.Nodes;

namespace FloodPanel.Storage.Tests.ProjectFile;

/// <summary>A place in a JSON tree, named as in the messages.</summary>
internal sealed record JsonPlace(string Path, JsonNode? Node, JsonNode? Parent, string Name)
{
    public static IEnumerable<JsonPlace> All(JsonNode root) => Below(new JsonPlace("", root, null, ""));

    public static JsonPlace Find(JsonNode root, string path) => All(root).Single(p => p.Path == path);

    public void Remove() => Parent!.AsObject().Remove(Name);

    public void Replace(JsonNode? node)
    {
        if (Parent is JsonArray list)
        {
            list[int.Parse(Name, CultureInfo.InvariantCulture)] = node;
        }
        else
        {
            Parent!.AsObject()[Name] = node;
        }
    }

    private static IEnumerable<JsonPlace> Below(JsonPlace place)
    {
        yield return place;
        var children = place.Node switch
        {
            JsonObject fields => fields.Select(f => new JsonPlace(
                place.Path.Length == 0 ? f.Key : $"{place.Path}.{f.Key}", f.Value, fields, f.Key)),
            JsonArray items => items.Select((item, i) => new JsonPlace($"{place.Path}[{i}]", item, items, $"{i}")),
            _ => [],
        };
        foreach (var below in children.SelectMany(Below))
        {
            yield return below;
        }
    }
}
