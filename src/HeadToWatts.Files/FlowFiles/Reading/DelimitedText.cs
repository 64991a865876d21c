using System.Buffers;
using System.Globalization;
using System.Text;
using CsvHelper;

namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>
/// Rows of cells out of text, each with its number in the file: delimited, apart by blanks, or of fixed widths. Cells come
/// trimmed. Cells of the present row can be taken as spans, so that a million rows make no million texts.
/// </summary>
internal sealed class DelimitedText : IDisposable
{
    /// <summary>Stands for "any run of blanks" as a delimiter, as in columns typed by hand.</summary>
    public const char Blanks = ' ';

    // A row of flows is short; an endless one is not read into memory.
    private const int LongestRow = 256 * 1024;
    private const int BufferBytes = 64 * 1024;

    private readonly TextReader? _reader;
    private readonly CsvReader? _parser;
    private readonly IReadOnlyList<int> _widths = [];
    private readonly char _delimiter;
    private string _line = "";
    private string[] _lineCells = [];
    private char[] _buffer = new char[1024];
    private int _used;
    private int _row;

    public DelimitedText(TextReader reader, char delimiter, bool quotes)
    {
        _reader = reader;
        _delimiter = delimiter;
        if (delimiter != Blanks)
            _parser = CsvReader.Create(reader, Options(delimiter, quotes, BufferBytes));
    }

    public DelimitedText(FlowFileSource source, char delimiter, bool quotes)
    {
        _delimiter = delimiter;
        if (delimiter != Blanks && source.OpenUtf8() is { } bytes)
        {
            _parser = CsvReader.Create(bytes, Options(delimiter, quotes, (int)Math.Clamp(source.Bytes, 1024, BufferBytes)));
            return;
        }

        _reader = source.OpenText();
        if (delimiter != Blanks)
            _parser = CsvReader.Create(_reader, Options(delimiter, quotes, BufferBytes));
    }

    /// <summary>Columns of fixed widths.</summary>
    public DelimitedText(FlowFileSource source, IReadOnlyList<int> widths)
    {
        _delimiter = Blanks;
        _widths = widths;
        _reader = source.OpenText();
    }

    /// <summary>Number of the present row in the file, from 1.</summary>
    public int Row => _row;

    /// <summary>How many cells the present row has.</summary>
    public int Count { get; private set; }

    /// <summary>A line that is blank or a comment.</summary>
    public static bool IsSkipped(ReadOnlySpan<char> line)
    {
        var text = line.TrimStart("\uFEFF\" \t");
        return text.IsEmpty || text[0] == '#' || text.StartsWith("sep=", StringComparison.OrdinalIgnoreCase) || (text.StartsWith("--") && text.Length > 2 && !text[2..].StartsWith("-"));
    }

    /// <summary>Splits one line.</summary>
    public static string[] Split(string line, char delimiter)
    {
        if (delimiter != Blanks && !line.Contains('"', StringComparison.Ordinal))
            return line.Trim('\uFEFF').Split(delimiter, StringSplitOptions.TrimEntries);
        using var text = new DelimitedText(new StringReader(line), delimiter, quotes: true);
        return text.Next(out var cells, out _) ? cells : [];
    }

    /// <summary>Splits one line by widths; what lies beyond the last one is a cell of its own.</summary>
    public static string[] Split(string line, IReadOnlyList<int> widths)
    {
        var cells = new List<string>();
        var at = 0;
        foreach (var width in widths)
        {
            if (at >= line.Length)
                break;
            var end = Math.Min(line.Length, at + width);
            cells.Add(line[at..end].Trim());
            at = end;
        }

        if (at < line.Length && line[at..].Trim() is { Length: > 0 } rest)
            cells.Add(rest);
        return [.. cells];
    }

    /// <summary>The next row that holds something and is no comment, as texts.</summary>
    public bool Next(out string[] cells, out int row)
    {
        cells = [];
        row = _row;
        if (!Read())
            return false;
        row = _row;
        cells = Cells();
        return true;
    }

    /// <summary>Goes to the next row that holds something and is no comment.</summary>
    public bool Read()
    {
        while (ReadAny())
        {
            if (Count == 0)
                continue;
            var first = Cell(0);
            if (!IsSkipped(first))
                return true;
            if (first.Length == 0 && HoldsSomething())
                return true;
        }

        return false;
    }

    /// <summary>Goes to the next row, whatever it holds; a blank line may be passed over.</summary>
    public bool ReadAny()
    {
        _used = 0;
        if (_parser is null)
        {
            if (_reader!.ReadLine() is not { } line)
                return false;
            _row++;
            if (line.Length > LongestRow)
                throw new CsvFormatException("The row is too long.");
            _line = line;
            _lineCells = _widths.Count > 0 ? Split(line.Trim('\uFEFF'), _widths) : line.Trim('\uFEFF', ' ', '\t').Split((char[]?)null, StringSplitOptions.RemoveEmptyEntries);
            Count = _lineCells.Length;
            return true;
        }

        if (!_parser.Read())
            return false;
        _row = (int)_parser.LineNumber;
        Count = _parser.FieldCount;
        return true;
    }

    /// <summary>A cell of the present row; empty beyond its last. The span holds until the next row.</summary>
    public ReadOnlySpan<char> Cell(int index)
    {
        if (index < 0 || index >= Count)
            return default;
        if (_parser is null)
            return _lineCells[index];
        var bytes = _parser.GetSpan(index);
        if (bytes.Length == 0)
            return default;
        if (_used + bytes.Length > _buffer.Length)
        {
            // Spans given out before stay valid on the old array.
            _buffer = new char[Math.Max(1024, bytes.Length * 2)];
            _used = 0;
        }

        var room = _buffer.AsSpan(_used);
        if (Ascii.ToUtf16(bytes, room, out var written) != OperationStatus.Done)
            written = Encoding.UTF8.GetChars(bytes, room);
        _used += written;
        return room[..written].Trim().Trim('\uFEFF').Trim();
    }

    /// <summary>The cells of the present row as texts.</summary>
    public string[] Cells()
    {
        if (_parser is null)
            return _lineCells;
        var cells = new string[Count];
        for (var i = 0; i < cells.Length; i++)
            cells[i] = Cell(i).ToString();
        return cells;
    }

    /// <summary>The present row as it is told in a problem.</summary>
    public string RowText() => _parser is null ? _line.Trim() : string.Join(_delimiter, Cells());

    /// <summary>Whether a cell after the last expected one holds something.</summary>
    public bool HoldsMoreThan(int cells)
    {
        for (var i = cells; i < Count; i++)
        {
            if (Cell(i).Length > 0)
                return true;
        }

        return false;
    }

    public void Dispose()
    {
        _parser?.Dispose();
        _reader?.Dispose();
    }

    private static CsvReaderOptions Options(char delimiter, bool quotes, int bufferBytes) => new()
    {
        BufferSize = bufferBytes,
        Separator = delimiter,
        Mode = quotes ? CsvMode.Rfc4180 : CsvMode.NoEscape,
        HasHeader = false,
        AllowLineBreaksInQuotes = false,
        DetectSeparatorHint = false,
        TrackLineNumbers = true,
        MaxRecordSize = LongestRow,
        FormatProvider = CultureInfo.InvariantCulture,
    };

    private bool HoldsSomething() => HoldsMoreThan(0);
}
