namespace HeadToWatts.Memos.Layout;

/// <summary>A finished page: its steps in the order in which they are painted and read.</summary>
internal sealed record PageLayout(int Number, IReadOnlyList<Op> Ops);

/// <summary>
/// Puts strips on pages. Strips that belong together stay together; a figure that does not fit waits for the next page while the
/// text goes on, but never past a heading that begins a page.
/// </summary>
internal sealed class Paginator
{
    private readonly double _firstTopPt;
    private readonly double _topPt;
    private readonly double _bottomPt;
    private readonly List<List<Op>> _pages = [];
    private readonly Queue<Strip> _waiting = new();
    private double _y;
    private bool _atTop;
    private int _depth;

    private Paginator(double firstTopPt, double topPt, double bottomPt)
    {
        _firstTopPt = firstTopPt;
        _topPt = topPt;
        _bottomPt = bottomPt;
    }

    public static IReadOnlyList<PageLayout> Paginate(IReadOnlyList<Strip> strips, double firstTopPt, double topPt, double bottomPt)
    {
        var paginator = new Paginator(firstTopPt, topPt, bottomPt);
        paginator.Run(strips);
        return [.. paginator._pages.Select((ops, i) => new PageLayout(i + 1, ops))];
    }

    private void Run(IReadOnlyList<Strip> strips)
    {
        NewPage();
        for (var i = 0; i < strips.Count;)
        {
            var end = i;
            while (end < strips.Count - 1 && strips[end].KeepWithNext)
                end++;
            var group = strips.Skip(i).Take(end - i + 1).ToList();
            i = end + 1;
            // A heading keeps its first lines, not the picture after them.
            // A figure that waits may stand in the section after its own, but not in an appendix.
            PlaceWaiting(force: group[0].NewPage && !_atTop);
            if (group[0].NewPage && !_atTop)
                NewPage();
            if (group is [{ Floats: true }] && (_waiting.Count > 0 || !Fits(group)))
                _waiting.Enqueue(group[0]);
            else
                Place(group);
        }

        PlaceWaiting(force: true);
    }

    private void PlaceWaiting(bool force)
    {
        while (_waiting.Count > 0 && _depth == 0)
        {
            if (!force && !Fits([_waiting.Peek()]))
                return;
            Place([_waiting.Dequeue()]);
        }
    }

    private void Place(List<Strip> group)
    {
        if (!Fits(group) && !_atTop)
            NewPage();
        if (_atTop && _depth == 0 && _waiting.Count > 0 && !group[0].Floats)
        {
            PlaceWaiting(force: false);
            if (!Fits(group) && !_atTop)
                NewPage();
        }

        foreach (var strip in group)
        {
            // Only a group taller than a page comes to its end here.
            if (_y + (_atTop ? 0 : strip.SpaceBeforePt) + strip.HeightPt > _bottomPt + 1e-6 && !_atTop)
                NewPage();
            if (_atTop && strip.Repeat is { } head && _depth > 0)
                Put(head);
            Put(strip);
        }
    }

    private bool Fits(List<Strip> group)
    {
        var height = _atTop && group[0].Repeat is { } head && _depth > 0 ? head.HeightPt : 0;
        for (var i = 0; i < group.Count; i++)
            height += group[i].HeightPt + (i == 0 && _atTop ? 0 : group[i].SpaceBeforePt);
        return _y + height <= _bottomPt + 1e-6;
    }

    private void Put(Strip strip)
    {
        if (!_atTop)
            _y += strip.SpaceBeforePt;
        foreach (var op in strip.Ops)
        {
            _pages[^1].Add(op.Down(_y));
            _depth += op switch { OpenTag or OpenFigure => 1, CloseTag => -1, _ => 0 };
        }

        _y += strip.HeightPt;
        _atTop = false;
    }

    private void NewPage()
    {
        _pages.Add([]);
        _y = _pages.Count == 1 ? _firstTopPt : _topPt;
        _atTop = true;
    }
}
