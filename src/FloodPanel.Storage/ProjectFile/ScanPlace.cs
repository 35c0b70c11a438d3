using System.Text.Json;

namespace FloodPanel.Storage.ProjectFile;

/// <summary>Where in the file a scan stands, as a path.</summary>
internal sealed class ScanPlace
{
    private const int LargestNumberOfItems = 10_000;

    private readonly Stack<Frame> frames = new();
    private bool begun;

    /// <summary>True when the outermost value is complete.</summary>
    public bool IsAtEnd => begun && frames.Count == 0;

    /// <summary>The sentence for a list or object of more items than could be meant; its own place is then the path.</summary>
    public string? Crowd { get; private set; }

    public string Path
    {
        get
        {
            var path = "";
            foreach (var frame in frames.Reverse())
            {
                path = frame.IsList ? FilePath.Item(path, frame.Index)
                    : frame.Name is null ? path
                    : FilePath.Field(path, frame.Name);
            }

            return path;
        }
    }

    public void Pass(ref Utf8JsonReader reader)
    {
        begun = true;
        switch (reader.TokenType)
        {
            case JsonTokenType.StartObject or JsonTokenType.StartArray:
                frames.Push(new Frame { IsList = reader.TokenType == JsonTokenType.StartArray });
                break;
            case JsonTokenType.EndObject or JsonTokenType.EndArray:
                frames.Pop();
                CompleteValue();
                break;
            case JsonTokenType.PropertyName:
                frames.Peek().Name = reader.GetString();
                break;
            case JsonTokenType.String when reader.ValueIsEscaped:
                // Decoded for nothing but its exception: half a surrogate pair must be refused while the place is known.
                reader.GetString();
                CompleteValue();
                break;
            default:
                CompleteValue();
                break;
        }
    }

    private void CompleteValue()
    {
        if (frames.TryPeek(out var frame))
        {
            frame.Index++;
            frame.Name = null;
            if (frame.Index > LargestNumberOfItems)
            {
                frames.Pop();
                Crowd = frame.IsList
                    ? $"The list has more than {LargestNumberOfItems} items; allowed are at most {LargestNumberOfItems}."
                    : $"The object has more than {LargestNumberOfItems} fields; a project file has fewer.";
            }
        }
    }

    private sealed class Frame
    {
        public bool IsList { get; init; }

        public int Index { get; set; }

        public string? Name { get; set; }
    }
}
