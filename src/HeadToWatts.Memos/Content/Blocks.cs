using HeadToWatts.Drawings.Canvas;

namespace HeadToWatts.Memos.Content;

/// <summary>A part of the memo's body.</summary>
public abstract record Block;

/// <summary>A heading.</summary>
/// <param name="Level">1 for a section, 2 for a part of one.</param>
/// <param name="Number">Its number, "4.2" or "A"; empty for none.</param>
/// <param name="Text">Its words.</param>
/// <param name="Anchor">Name that links lead to; unique in the memo.</param>
/// <param name="InContents">True to list it in the contents and the outline.</param>
/// <param name="OnNewPage">True to begin a page with it.</param>
public sealed record HeadingBlock(int Level, string Number, string Text, string Anchor, bool InContents = true, bool OnNewPage = false) : Block;

/// <summary>What a paragraph is for.</summary>
public enum ParagraphKind
{
    /// <summary>Running text.</summary>
    Body,

    /// <summary>The sentence that carries the answer.</summary>
    Lead,

    /// <summary>A remark in smaller, softer type.</summary>
    Note,

    /// <summary>A title within a part, too small for a number.</summary>
    Title,
}

/// <summary>A paragraph.</summary>
/// <param name="Text">Its text.</param>
/// <param name="Kind">What it is for.</param>
/// <param name="KeepWithNext">True to keep its last line on the page of what follows.</param>
public sealed record ParagraphBlock(RichText Text, ParagraphKind Kind = ParagraphKind.Body, bool KeepWithNext = false) : Block;

/// <summary>A formula on a line of its own.</summary>
/// <param name="Formula">The formula.</param>
/// <param name="Remark">Softer text at the right edge: a number or where it comes from.</param>
/// <param name="ContinuesAbove">True for a further line of the formula above it.</param>
/// <param name="KeepWithNext">True to keep it on the page of what follows.</param>
public sealed record FormulaBlock(RichText Formula, RichText Remark, bool ContinuesAbove = false, bool KeepWithNext = false) : Block;

/// <summary>A list.</summary>
/// <param name="Items">Its items.</param>
/// <param name="Labels">Label of each item ("1.", "[3]"); empty for bullets.</param>
/// <param name="Anchors">Anchor of each item; empty for none.</param>
public sealed record ListBlock(IReadOnlyList<RichText> Items, IReadOnlyList<string> Labels, IReadOnlyList<string> Anchors) : Block
{
    /// <summary>A list with bullets.</summary>
    public static ListBlock Bullets(params IReadOnlyList<RichText> items) => new(items, [], []);
}

/// <summary>How the cells of a column are set.</summary>
public enum ColumnAlign
{
    /// <summary>Text.</summary>
    Left,

    /// <summary>Numbers.</summary>
    Right,

    /// <summary>Marks.</summary>
    Middle,
}

/// <summary>A column of a table.</summary>
/// <param name="Head">Its head.</param>
/// <param name="Align">How its cells are set.</param>
/// <param name="Share">Share of spare width it takes; 0 keeps it as narrow as its text.</param>
public sealed record TableColumn(RichText Head, ColumnAlign Align = ColumnAlign.Left, double Share = 1);

/// <summary>What a row is.</summary>
public enum RowKind
{
    /// <summary>A row like the others.</summary>
    Plain,

    /// <summary>A sum: semi-bold, with a rule above it.</summary>
    Total,

    /// <summary>The row that was chosen: semi-bold on a tint.</summary>
    Chosen,
}

/// <summary>A row of a table.</summary>
/// <param name="Cells">Its cells, one a column.</param>
/// <param name="Kind">What it is.</param>
public sealed record TableRow(IReadOnlyList<RichText> Cells, RowKind Kind = RowKind.Plain);

/// <summary>A table. Its first column names the rows.</summary>
/// <param name="Anchor">Name that links lead to.</param>
/// <param name="Label">"Table 3", filled in when the memo is put together.</param>
/// <param name="Caption">What it shows.</param>
/// <param name="Columns">Its columns.</param>
/// <param name="Rows">Its rows.</param>
/// <param name="Note">A remark below it; empty for none.</param>
public sealed record TableBlock(string Anchor, string Label, RichText Caption, IReadOnlyList<TableColumn> Columns, IReadOnlyList<TableRow> Rows, RichText Note) : Block;

/// <summary>A figure.</summary>
/// <param name="Anchor">Name that links lead to.</param>
/// <param name="Label">"Figure 2", filled in when the memo is put together.</param>
/// <param name="Drawing">What is drawn.</param>
/// <param name="Caption">What it shows and what to see in it.</param>
/// <param name="AltText">The same for those who do not see it.</param>
public sealed record FigureBlock(string Anchor, string Label, Drawing Drawing, RichText Caption, string AltText) : Block;

/// <summary>How much a callout asks of the reader.</summary>
public enum CalloutKind
{
    /// <summary>A remark.</summary>
    Note,

    /// <summary>A caution: amber.</summary>
    Caution,

    /// <summary>A caution that may stop the scheme.</summary>
    Serious,
}

/// <summary>A paragraph set off by a bar at its left.</summary>
/// <param name="Kind">How much it asks of the reader.</param>
/// <param name="Heading">Its heading; may be empty.</param>
/// <param name="Text">Its text.</param>
/// <param name="Remark">Softer text below it, such as its authority; may be empty.</param>
public sealed record CalloutBlock(CalloutKind Kind, RichText Heading, RichText Text, RichText Remark) : Block;

/// <summary>A headline number.</summary>
/// <param name="Name">What it is.</param>
/// <param name="Value">The number.</param>
/// <param name="Unit">Its unit.</param>
/// <param name="Note">What it is out of or holds for.</param>
public sealed record KeyFigure(string Name, string Value, string Unit, RichText Note);

/// <summary>Headline numbers side by side.</summary>
/// <param name="Figures">The numbers; three or four to a row.</param>
public sealed record KeyFiguresBlock(IReadOnlyList<KeyFigure> Figures) : Block;

/// <summary>The head of the first page.</summary>
/// <param name="Kicker">What kind of paper it is.</param>
/// <param name="Title">The site.</param>
/// <param name="Subtitle">What is proposed there; may be empty.</param>
/// <param name="Status">What the paper may be used for.</param>
/// <param name="Facts">Name and value of each fact about the paper.</param>
public sealed record TitleBlock(string Kicker, string Title, string Subtitle, string Status, IReadOnlyList<(string Name, string Value)> Facts) : Block;

/// <summary>The contents: every heading that asks for it, with its page.</summary>
public sealed record ContentsBlock : Block;
