namespace HeadToWatts.Memos.Layout;

/// <summary>A slice of the body that is never divided: a line, a row, a figure.</summary>
internal sealed class Strip
{
    /// <summary>White above it, dropped at the top of a page.</summary>
    public double SpaceBeforePt { get; set; }

    public double HeightPt { get; set; }

    /// <summary>True to keep it on the page of the strip after it.</summary>
    public bool KeepWithNext { get; set; }

    /// <summary>True to begin a page with it.</summary>
    public bool NewPage { get; set; }

    /// <summary>True for a figure that may move to the top of the next page while the text goes on.</summary>
    public bool Floats { get; set; }

    /// <summary>Drawn above it when it begins a page: the head of a table.</summary>
    public Strip? Repeat { get; set; }

    public List<Op> Ops { get; } = [];
}
