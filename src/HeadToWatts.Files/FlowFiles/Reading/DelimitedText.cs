using System.Globalization;
using CsvHelper;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>Rows of cells out of delimited text, each with its number in the file. Cells come trimmed.</summary>
internal sealed class DelimitedText : IDisposable
{
    /// <summary>Stands for "any run of blanks" as a delimiter, as in columns typed by hand.</summary>
    public const char Blanks = ' ';

    // A row of flows is short; an endless one is not read into memory.
    private const int LongestRow = 256 * 1024;

    private readonly TextReader _reader;
    private readonly CsvReader? _parser;
    private int _row;

    public DelimitedText(TextReader reader, char delimiter, bool quotes)
    {
        _reader = reader;
        if (delimiter == Blanks)
            return;
        _parser = CsvReader.Create(reader, new CsvReaderOptions
        {
            Separator = delimiter,
            Mode = quotes ? CsvMode.Rfc4180 : CsvMode.NoEscape,
            HasHeader = false,
            AllowLineBreaksInQuotes = false,
            DetectSeparatorHint = false,
            TrackLineNumbers = true,
            MaxRecordSize = LongestRow,
            FormatProvider = CultureInfo.InvariantCulture,
        });
    }

    /// <summary>A line that is blank or a comment.</summary>
    public static bool IsSkipped(string line)
    {
        var text = line.AsSpan().TrimStart("\uFEFF\" \t");
        return text.IsEmpty || text[0] == '#' || text.StartsWith("sep=", StringComparison.OrdinalIgnoreCase) || (text.StartsWith("--") && text.Length > 2 && !text[2..].StartsWith("-"));
    }

    /// <summary>Splits one line.</summary>
    public static string[] Split(string line, char delimiter)
    {
        using var text = new DelimitedText(new StringReader(line), delimiter, quotes: true);
        return text.Next(out var cells, out _) ? cells : [];
    }

    /// <summary>The next row that holds something and is no comment.</summary>
    public bool Next(out string[] cells, out int row)
    {
        while (ReadRow(out cells, out row))
        {
            if (cells.Length > 0 && !(IsSkipped(cells[0]) && (cells[0].Length > 0 || Array.TrueForAll(cells, c => c.Length == 0))))
                return true;
        }

        return false;
    }

    public void Dispose()
    {
        _parser?.Dispose();
        _reader.Dispose();
    }

    private bool ReadRow(out string[] cells, out int row)
    {
        cells = [];
        row = 0;
        if (_parser is null)
        {
            if (_reader.ReadLine() is not { } line)
                return false;
            row = ++_row;
            if (line.Length > LongestRow)
                throw new CsvFormatException("The row is too long.");
            cells = line.Trim('\uFEFF', ' ', '\t').Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries);
            return true;
        }

        if (!_parser.Read())
            return false;
        row = (int)_parser.LineNumber;
        cells = new string[_parser.FieldCount];
        for (var i = 0; i < cells.Length; i++)
            cells[i] = _parser.GetString(i).Trim().Trim('\uFEFF').Trim();
        return true;
    }
}
