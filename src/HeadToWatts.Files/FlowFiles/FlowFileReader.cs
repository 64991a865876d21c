using System.Text;
using CsvHelper;
using HeadToWatts.Basis.Problems;

namespace HeadToWatts.Files.FlowFiles;

/// <summary>Reads a flow file of any known kind.</summary>
public static class FlowFileReader
{
    /// <summary>Recognises the format and reads the file, or lists every problem.</summary>
    /// <param name="name">Name of the file, as problems give it.</param>
    /// <param name="stream">The bytes, up to 64 MB.</param>
    /// <param name="options">What is known about the file.</param>
    /// <param name="cancellation">Stops the reading.</param>
    public static Checked<FlowFile> Read(string name, Stream stream, FlowFileOptions options, CancellationToken cancellation = default) =>
        Read(FlowFileSource.Hold(name, stream), options, cancellation);

    /// <summary>As <see cref="Read(string, Stream, FlowFileOptions, CancellationToken)"/>, for a stream that arrives piece by piece.</summary>
    public static async Task<Checked<FlowFile>> ReadAsync(string name, Stream stream, FlowFileOptions options, CancellationToken cancellation = default) =>
        Read(await FlowFileSource.HoldAsync(name, stream, cancellation).ConfigureAwait(false), options, cancellation);

    /// <summary>Reads text that was pasted, as from a spreadsheet.</summary>
    public static Checked<FlowFile> ReadText(string name, string text, FlowFileOptions options)
    {
        ArgumentNullException.ThrowIfNull(text);
        using var stream = new MemoryStream(Encoding.UTF8.GetBytes(text));
        return Read(name, stream, options);
    }

    private static Checked<FlowFile> Read(Checked<FlowFileSource> held, FlowFileOptions options, CancellationToken cancellation)
    {
        ArgumentNullException.ThrowIfNull(options);
        if (!held.TryGet(out var source))
            return Checked.Refused<FlowFile>(held.Problems);
        if (WhyNotText(source.FirstBytes) is { } why)
            return Checked.Refused<FlowFile>(new Problem(source.Name, "its first bytes", why, Accepted()));

        IFlowFileFormat? format;
        if (options.Format is { } id)
        {
            format = FlowFileFormats.Find(id);
            if (format is null)
                return Checked.Refused<FlowFile>(new Problem(source.Name, id, "there is no such format", string.Join(", ", FlowFileFormats.All.Select(f => f.Id))));
        }
        else
        {
            var head = FlowFileHead.Of(source);
            format = FlowFileFormats.All.FirstOrDefault(f => f.Recognises(head));
            if (format is null)
            {
                var first = head.Content().Select(l => l.Text).FirstOrDefault() ?? "";
                return Checked.Refused<FlowFile>(new Problem(source.Name, Shorten(first), "this is not a kind of flow file that is known here", Accepted()));
            }
        }

        try
        {
            return format.Read(source, options, cancellation);
        }
        catch (CsvFormatException)
        {
            return Checked.Refused<FlowFile>(new Problem(source.Name, "a row of more than 256 kB", "this is not a table of flows", "one row a day, or one row for each percent"));
        }
    }

    private static string Accepted() => string.Join("; ", FlowFileFormats.All.Select(f => f.Name));

    private static string Shorten(string text) => text.Length <= 60 ? text : text[..60] + "...";

    private static string? WhyNotText(ReadOnlySpan<byte> first)
    {
        if (first.Length == 0)
            return "the file is empty";
        if (first.StartsWith("PK"u8))
            return "this is a workbook or a zip archive; save the sheet as CSV";
        if (first.StartsWith("%PDF"u8))
            return "this is a PDF document, not a table of text";
        var wide = first.StartsWith<byte>([0xFF, 0xFE]) || first.StartsWith<byte>([0xFE, 0xFF]);
        return !wide && first.Contains((byte)0) ? "this is not a text file" : null;
    }
}
