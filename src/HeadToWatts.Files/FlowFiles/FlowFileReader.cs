using System.Text;
using CsvHelper;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Files.FlowFiles.Recipes;

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
        Read(name, stream, options, null, cancellation);

    /// <summary>As <see cref="Read(string, Stream, FlowFileOptions, CancellationToken)"/>, telling how far it has come.</summary>
    /// <param name="name">Name of the file, as problems give it.</param>
    /// <param name="stream">The bytes, up to 64 MB.</param>
    /// <param name="options">What is known about the file.</param>
    /// <param name="progress">Is told the share of the bytes that are read, 0 to 1.</param>
    /// <param name="cancellation">Stops the reading.</param>
    public static Checked<FlowFile> Read(string name, Stream stream, FlowFileOptions options, IProgress<double>? progress, CancellationToken cancellation)
    {
        var held = FlowFileSource.Hold(name, stream);
        return held.TryGet(out var source) ? Read(source, options, progress, cancellation) : Checked.Refused<FlowFile>(held.Problems);
    }

    /// <summary>As <see cref="Read(string, Stream, FlowFileOptions, CancellationToken)"/>, for a stream that arrives piece by piece.</summary>
    public static async Task<Checked<FlowFile>> ReadAsync(string name, Stream stream, FlowFileOptions options, CancellationToken cancellation = default)
    {
        var held = await FlowFileSource.HoldAsync(name, stream, cancellation).ConfigureAwait(false);
        return held.TryGet(out var source) ? Read(source, options, null, cancellation) : Checked.Refused<FlowFile>(held.Problems);
    }

    /// <summary>Reads text that was pasted, as from a spreadsheet.</summary>
    public static Checked<FlowFile> ReadText(string name, string text, FlowFileOptions options)
    {
        ArgumentNullException.ThrowIfNull(text);
        using var stream = new MemoryStream(Encoding.UTF8.GetBytes(text));
        return Read(name, stream, options);
    }

    /// <summary>Reads bytes that are held already, so that a file can be read again with other choices.</summary>
    /// <param name="source">The bytes.</param>
    /// <param name="options">What is known about the file.</param>
    /// <param name="progress">Is told the share of the bytes that are read, 0 to 1.</param>
    /// <param name="cancellation">Stops the reading.</param>
    public static Checked<FlowFile> Read(FlowFileSource source, FlowFileOptions options, IProgress<double>? progress = null, CancellationToken cancellation = default)
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(options);
        if (WhyNotText(source) is { } why)
            return Checked.Refused<FlowFile>(new Problem(source.Name, "its first bytes", why, Accepted()));

        IFlowFileFormat? format = null;
        if (options.Recipe is null && options.Format is { } id)
        {
            format = FlowFileFormats.Find(id);
            if (format is null)
                return Checked.Refused<FlowFile>(new Problem(source.Name, id, "there is no such format", string.Join(", ", FlowFileFormats.All.Select(f => f.Id))));
        }
        else if (options.Recipe is null)
        {
            var head = FlowFileHead.Of(source);
            format = FlowFileFormats.All.FirstOrDefault(f => f.Recognises(head));
            if (WhyNotFlow(head) is { } other)
                return Checked.Refused<FlowFile>(new Problem(source.Name, Shorten(head.Lines[0]), other, Accepted()));
            if (format is null)
            {
                var first = head.Content().Select(l => l.Text).FirstOrDefault() ?? "";
                return Checked.Refused<FlowFile>(new Problem(source.Name, Shorten(first), "this is not a kind of flow file that is known here; a reading recipe can say how its rows are read", Accepted()));
            }
        }

        source.Meter.Start(progress);
        try
        {
            var read = format is null ? RecipeReader.Read(source, options, cancellation) : format.Read(source, options, cancellation);
            source.Meter.Done();
            return read;
        }
        catch (CsvFormatException)
        {
            return Checked.Refused<FlowFile>(new Problem(source.Name, "a row of more than 256 kB", "this is not a table of flows", "one row a day, or one row for each percent"));
        }
        finally
        {
            source.Meter.Start(null);
        }
    }

    private static string Accepted() => string.Join("; ", FlowFileFormats.All.Select(f => f.Name));

    private static string Shorten(string text) => text.Length <= 60 ? text : text[..60] + "...";

    // A stage-discharge table has rows of numbers that could pass for a curve.
    private static string? WhyNotFlow(FlowFileHead head) =>
        head.Lines.Take(30).Any(l => l.Contains("is a function of", StringComparison.OrdinalIgnoreCase) || l.StartsWith("Interpolation Technique", StringComparison.OrdinalIgnoreCase))
            ? "this is a rating table, which turns a stage into a flow; it is no record of flows"
            : null;

    private static string? WhyNotText(FlowFileSource source)
    {
        var first = source.FirstBytes;
        if (first.Length == 0)
            return "the file is empty";
        if (first.StartsWith("PK"u8))
            return "this is a workbook or a zip archive; save the sheet as CSV";
        if (first.StartsWith("%PDF"u8))
            return "this is a PDF document, not a table of text";
        return !source.IsWide && first.Contains((byte)0) ? "this is not a text file" : null;
    }
}
