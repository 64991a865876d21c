using HeadToWatts.Files.FlowFiles.Reading;

namespace HeadToWatts.Files.FlowFiles;

/// <summary>The opening lines of a flow file, by which its kind is recognised.</summary>
public sealed class FlowFileHead
{
    private const int MostLines = 400;
    private const int LongestLine = 4096;

    private FlowFileHead(string name, IReadOnlyList<string> lines)
    {
        Name = name;
        Lines = lines;
    }

    /// <summary>Name of the file.</summary>
    public string Name { get; }

    /// <summary>Up to 400 opening lines, without byte-order marks.</summary>
    public IReadOnlyList<string> Lines { get; }

    /// <summary>The opening lines of a file.</summary>
    public static FlowFileHead Of(FlowFileSource source)
    {
        ArgumentNullException.ThrowIfNull(source);
        return source.Head;
    }

    internal static FlowFileHead Find(FlowFileSource source)
    {
        using var reader = source.OpenText();
        var lines = new List<string>();
        var line = new System.Text.StringBuilder();
        var previous = -1;
        int c;
        while (lines.Count < MostLines && (c = reader.Read()) >= 0)
        {
            if (c is '\n' or '\r')
            {
                if (!(c == '\n' && previous == '\r'))
                    Flush();
            }
            else if (line.Length < LongestLine)
            {
                line.Append((char)c);
            }

            previous = c;
        }

        if (line.Length > 0 && lines.Count < MostLines)
            Flush();
        return new FlowFileHead(source.Name, lines);

        void Flush()
        {
            lines.Add(line.ToString().Trim('\uFEFF'));
            line.Clear();
        }
    }

    /// <summary>Lines that are neither blank nor a comment, with their number in the file.</summary>
    internal IEnumerable<(int Row, string Text)> Content()
    {
        for (var i = 0; i < Lines.Count; i++)
        {
            if (!DelimitedText.IsSkipped(Lines[i]))
                yield return (i + 1, Lines[i]);
        }
    }
}
