using System.Collections;
using System.Reflection;

namespace FloodPanel.Calculation.Tests.Generated;

/// <summary>Every number in a tree of records, with the way to it.</summary>
internal static class Figures
{
    public static IEnumerable<(string Path, double Value)> Of(object? item, Func<string, bool> skip, string path = "")
    {
        switch (item)
        {
            case null or string or Enum or bool or Sentence:
                yield break;
            case double number:
                yield return (path, number);
                yield break;
            case int count:
                yield return (path, count);
                yield break;
        }

        foreach (var (name, part) in Parts(item))
        {
            foreach (var figure in skip(name) ? [] : Of(part, skip, $"{path}.{name}"))
            {
                yield return figure;
            }
        }
    }

    private static IEnumerable<(string Name, object? Part)> Parts(object item) => item is IEnumerable list
        ? list.Cast<object?>().Select((part, i) => ($"[{i}]", part))
        : item.GetType().GetProperties(BindingFlags.Public | BindingFlags.Instance)
            .Where(p => p.GetIndexParameters().Length == 0)
            .Select(p => (p.Name, p.GetValue(item)));
}
