using HeadToWatts.Drawings.Canvas;
using HeadToWatts.Memos.Layout.Type;

namespace HeadToWatts.Memos.Layout;

/// <summary>A step of drawing or of tagging. y runs down, from the top of its strip and later of its page.</summary>
internal abstract record Op
{
    public virtual Op Down(double dyPt) => this;
}

/// <summary>Begins an element of the document's structure.</summary>
/// <param name="Tag">PDF structure type: "P", "H2", "TR".</param>
/// <param name="Grouping">True for an element that holds others and no text of its own.</param>
/// <param name="Scope">"Column" or "Row" for the head cell of a table; empty otherwise.</param>
internal sealed record OpenTag(string Tag, bool Grouping = false, string Scope = "") : Op;

/// <summary>Begins a figure.</summary>
internal sealed record OpenFigure(double XPt, double YPt, double WidthPt, double HeightPt, string AltText) : Op
{
    public override Op Down(double dyPt) => this with { YPt = YPt + dyPt };
}

/// <summary>Ends the element begun last.</summary>
internal sealed record CloseTag : Op;

/// <summary>Text on a baseline.</summary>
internal sealed record TextOp(double XPt, double YPt, string Text, Face Face, double SizePt, Rgb Colour, double WidthPt, string Target = "", bool Decoration = false) : Op
{
    public override Op Down(double dyPt) => this with { YPt = YPt + dyPt };
}

/// <summary>A filled rectangle; never read out.</summary>
internal sealed record FillOp(double XPt, double YPt, double WidthPt, double HeightPt, Rgb Colour) : Op
{
    public override Op Down(double dyPt) => this with { YPt = YPt + dyPt };
}

/// <summary>A level rule; never read out.</summary>
internal sealed record RuleOp(double XPt, double YPt, double WidthPt, double ThicknessPt, Rgb Colour) : Op
{
    public override Op Down(double dyPt) => this with { YPt = YPt + dyPt };
}

/// <summary>A drawing, scaled into its place.</summary>
internal sealed record DrawingOp(double XPt, double YPt, double Scale, Drawing Drawing) : Op
{
    public override Op Down(double dyPt) => this with { YPt = YPt + dyPt };
}

/// <summary>A place that links lead to.</summary>
internal sealed record AnchorOp(string Name, double YPt) : Op
{
    public override Op Down(double dyPt) => this with { YPt = YPt + dyPt };
}

/// <summary>An entry of the outline that viewers show beside the pages.</summary>
internal sealed record OutlineOp(int Level, string Title, double YPt) : Op
{
    public override Op Down(double dyPt) => this with { YPt = YPt + dyPt };
}
