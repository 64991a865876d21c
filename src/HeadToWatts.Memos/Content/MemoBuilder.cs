using System.Globalization;
using HeadToWatts.Basis.Sources;
using HeadToWatts.Drawings.Canvas;

namespace HeadToWatts.Memos.Content;

/// <summary>
/// Puts the body of a memo together: numbers sections, figures, tables and sources in the order in which they come, and fills
/// in the references to them.
/// </summary>
public sealed class MemoBuilder
{
    private readonly List<Block> _blocks = [];
    private readonly Dictionary<string, string> _labels = new(StringComparer.Ordinal);
    private readonly List<Source> _sources = [];
    private int _section;
    private int _part;
    private int _appendix;
    private int _figures;
    private int _tables;
    private string _number = "";

    /// <summary>The sources cited so far; the first is number 1.</summary>
    public IReadOnlyList<Source> Sources => _sources;

    /// <summary>Adds a block as it is.</summary>
    public void Add(Block block) => _blocks.Add(block);

    /// <summary>Begins a numbered section.</summary>
    public void Section(string title, string anchor, bool onNewPage = false)
    {
        _part = 0;
        _number = (++_section).ToString(CultureInfo.InvariantCulture);
        Label(anchor, "Section " + _number);
        Add(new HeadingBlock(1, _number, title, anchor, OnNewPage: onNewPage));
    }

    /// <summary>Begins an appendix, numbered A, B, C.</summary>
    public void Appendix(string title, string anchor, bool onNewPage = false)
    {
        _part = 0;
        _number = ((char)('A' + _appendix++)).ToString();
        Label(anchor, "Appendix " + _number);
        Add(new HeadingBlock(1, _number, title, anchor, OnNewPage: onNewPage));
    }

    /// <summary>Begins a part of the section.</summary>
    public void Part(string title, string anchor)
    {
        var number = _number + "." + (++_part).ToString(CultureInfo.InvariantCulture);
        Label(anchor, "Section " + number);
        Add(new HeadingBlock(2, number, title, anchor, InContents: false));
    }

    /// <summary>Adds a paragraph.</summary>
    public void Say(RichText text, ParagraphKind kind = ParagraphKind.Body, bool keepWithNext = false) => Add(new ParagraphBlock(text, kind, keepWithNext));

    /// <summary>Adds a figure and gives it the next number.</summary>
    public void Figure(string anchor, Drawing drawing, RichText caption)
    {
        ArgumentNullException.ThrowIfNull(drawing);
        var label = "Figure " + (++_figures).ToString(CultureInfo.InvariantCulture);
        Label(anchor, label);
        Add(new FigureBlock(anchor, label, drawing, caption, drawing.Title + ". " + drawing.Description));
    }

    /// <summary>Adds a table and gives it the next number.</summary>
    public void Table(string anchor, RichText caption, IReadOnlyList<TableColumn> columns, IReadOnlyList<TableRow> rows, RichText? note = null)
    {
        ArgumentNullException.ThrowIfNull(columns);
        ArgumentNullException.ThrowIfNull(rows);
        foreach (var row in rows)
        {
            if (row.Cells.Count != columns.Count)
                throw new ArgumentException($"A row of table '{anchor}' has {row.Cells.Count} cells for {columns.Count} columns.", nameof(rows));
        }

        var label = "Table " + (++_tables).ToString(CultureInfo.InvariantCulture);
        Label(anchor, label);
        Add(new TableBlock(anchor, label, caption, columns, rows, note ?? RichText.Empty));
    }

    /// <summary>Cites a source: "[3]", or "[3] Eq. 7" with a locator. A source gets its number when it is first cited.</summary>
    public RichText Cite(Source source, string locator = "")
    {
        ArgumentNullException.ThrowIfNull(source);
        ArgumentNullException.ThrowIfNull(locator);
        var at = _sources.FindIndex(s => s.Id == source.Id);
        if (at < 0)
        {
            at = _sources.Count;
            _sources.Add(source);
        }

        var number = (at + 1).ToString(CultureInfo.InvariantCulture);
        var cite = RichText.Link("[" + number + "]", SourceAnchor(at + 1));
        return locator.Length == 0 ? cite : cite + ("\u00a0" + locator);
    }

    /// <summary>Anchor of a source in the list of sources.</summary>
    public static string SourceAnchor(int number) => "source-" + number.ToString(CultureInfo.InvariantCulture);

    /// <summary>Ends the body: references get their words.</summary>
    /// <exception cref="InvalidOperationException">A reference leads to nothing.</exception>
    public IReadOnlyList<Block> Finish() => [.. _blocks.Select(Resolve)];

    private void Label(string anchor, string label)
    {
        if (!_labels.TryAdd(anchor, label))
            throw new InvalidOperationException($"The anchor '{anchor}' is used twice.");
    }

    private Block Resolve(Block block) => block switch
    {
        ParagraphBlock p => p with { Text = Resolve(p.Text) },
        FormulaBlock f => f with { Formula = Resolve(f.Formula), Remark = Resolve(f.Remark) },
        ListBlock l => l with { Items = [.. l.Items.Select(Resolve)] },
        TableBlock t => t with
        {
            Caption = Resolve(t.Caption),
            Note = Resolve(t.Note),
            Rows = [.. t.Rows.Select(r => r with { Cells = [.. r.Cells.Select(Resolve)] })],
        },
        FigureBlock f => f with { Caption = Resolve(f.Caption) },
        CalloutBlock c => c with { Heading = Resolve(c.Heading), Text = Resolve(c.Text), Remark = Resolve(c.Remark) },
        KeyFiguresBlock k => k with { Figures = [.. k.Figures.Select(f => f with { Note = Resolve(f.Note) })] },
        _ => block,
    };

    private RichText Resolve(RichText text) => text.Runs.All(r => r.Text.Length > 0 || r.Target.Length == 0)
        ? text
        : RichText.From(text.Runs.Select(r => r.Text.Length == 0 && r.Target.Length > 0
            ? r with { Text = _labels.TryGetValue(r.Target, out var label) ? label.Replace(' ', '\u00a0') : throw new InvalidOperationException($"A reference leads to '{r.Target}', which is not in the memo.") }
            : r));
}
