namespace HeadToWatts.Files.FlowFiles.Reading;

/// <summary>How a table of text is laid out: its delimiter, the names of its columns and where its data begin.</summary>
/// <param name="Delimiter">Tab, semicolon, comma, or blanks.</param>
/// <param name="Names">Names of the columns; empty where there is no header.</param>
/// <param name="UnitRow">A row of units between header and data; empty where there is none.</param>
/// <param name="FirstRow">Number of the first row of data in the file.</param>
/// <param name="FirstCells">Cells of the first row that was sure to be data.</param>
internal sealed record TableLayout(char Delimiter, string[] Names, string[] UnitRow, int FirstRow, string[] FirstCells)
{
    /// <summary>Names of all columns, by number where the file gives none.</summary>
    public string ColumnName(int column) =>
        column < Names.Length && Names[column].Length > 0 ? Names[column] : $"column {(column + 1).ToString(System.Globalization.CultureInfo.InvariantCulture)}";

    public int ColumnCount => Math.Max(Names.Length, FirstCells.Length);

    /// <summary>The unit row's cell if it has one, else the name.</summary>
    public string NameForUnit(int column) =>
        column < UnitRow.Length && UnitRow[column].Length > 0 ? $"({UnitRow[column].Trim('(', ')', '[', ']')})" : ColumnName(column);

    /// <summary>A table of which some cell in the first row of data is a date.</summary>
    public static TableLayout? FindDaily(FlowFileHead head) =>
        Find(head, ['\t', ';', ','], cells => DateColumn(cells) >= 0);

    /// <summary>A table of which the first row of data is at least two numbers.</summary>
    public static TableLayout? FindNumbers(FlowFileHead head) =>
        Find(head, ['\t', ';', ',', DelimitedText.Blanks], cells => cells.Count(BeginsWithNumber) >= 2);

    /// <summary>The first column that holds a date; -1 when none does.</summary>
    public static int DateColumn(string[] cells) => Array.FindIndex(cells, c => WrittenDate.TryRead(c, out _, out _));

    /// <summary>The first other column that holds a time of day; -1 when none does.</summary>
    public static int TimeColumn(string[] cells, int dateColumn) =>
        Array.FindIndex(cells, c => c.Contains(':', StringComparison.Ordinal) && Array.IndexOf(cells, c) != dateColumn && WrittenTime.TryRead(c, compact: false, out _, out _));

    public static bool BeginsWithNumber(string cell)
    {
        var text = cell.TrimStart('+', '-');
        return text.Length > 0 && (char.IsAsciiDigit(text[0]) || (text[0] == '.' && text.Length > 1 && char.IsAsciiDigit(text[1])));
    }

    private static TableLayout? Find(FlowFileHead head, char[] delimiters, Func<string[], bool> isData)
    {
        var above = new List<(int Row, string Text)>();
        foreach (var line in head.Content())
        {
            foreach (var delimiter in delimiters)
            {
                if (!line.Text.Contains(delimiter, StringComparison.Ordinal) && delimiter != DelimitedText.Blanks)
                    continue;
                var cells = DelimitedText.Split(line.Text, delimiter);
                if (cells.Length >= 2 && isData(cells))
                    return WithHeader(above, delimiter, line.Row, cells);
            }

            above.Add(line);
        }

        return null;
    }

    // Above the first good row stand rows that are wrong (they hold numbers, and must be reported), a row of units, the header.
    private static TableLayout WithHeader(List<(int Row, string Text)> above, char delimiter, int firstRow, string[] cells)
    {
        var at = above.Count - 1;
        string[] header = [];
        for (; at >= 0; at--)
        {
            header = DelimitedText.Split(above[at].Text, delimiter);
            if (header.Length < 2 || !Array.Exists(header, BeginsWithNumber))
                break;
            firstRow = above[at].Row;
            header = [];
        }

        string[] units = [];
        if (header.Length >= 2 && Array.Exists(header, c => HeaderUnit.FindFlow(c.Trim('(', ')', '[', ']')) is not null) && at > 0)
        {
            var upper = DelimitedText.Split(above[at - 1].Text, delimiter);
            if (upper.Length >= 2)
                (units, header) = (header, upper);
        }

        return new TableLayout(delimiter, header.Length >= 2 ? header : [], units, firstRow, cells);
    }
}
