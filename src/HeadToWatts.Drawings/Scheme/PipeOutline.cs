using HeadToWatts.Drawings.Canvas;

namespace HeadToWatts.Drawings.Scheme;

/// <summary>The pipes' upper and lower edges on the drawing.</summary>
internal sealed record PipeOutline(IReadOnlyList<Point> Upper, IReadOnlyList<Point> Lower, IReadOnlyList<(Point From, Point To, double HalfThickness)> Centres, bool IsToScale)
{
    private const double LeastHalf = 2.6;

    public static PipeOutline Of(SchemeSectionInput input, SectionLayout at)
    {
        var upper = new List<Point>();
        var lower = new List<Point>();
        var centres = new List<(Point, Point, double)>();
        var toScale = true;
        var stationM = 0.0;
        for (var i = 0; i < input.Pipes.Count; i++)
        {
            var pipe = input.Pipes[i];
            var from = new Point(at.X(stationM), at.Y(input.Grades[2 * i].CentreLevelM));
            stationM += pipe.LengthM;
            var to = new Point(at.X(stationM), at.Y(input.Grades[(2 * i) + 1].CentreLevelM));

            // The normal of the true pipe, drawn in the two scales: what a section stretched in height looks like.
            var (dxM, dzM) = ((to.X - from.X) / at.HorizontalScale, (from.Y - to.Y) / at.VerticalScale);
            var lengthM = Math.Sqrt((dxM * dxM) + (dzM * dzM));
            if (lengthM <= 0)
                continue;
            var radius = pipe.InsideDiameterM / 2;
            var offset = new Point(-dzM / lengthM * radius * at.HorizontalScale, -dxM / lengthM * radius * at.VerticalScale);
            var (px, py) = (to.X - from.X, to.Y - from.Y);
            var half = Math.Abs((offset.X * py) - (offset.Y * px)) / Math.Sqrt((px * px) + (py * py));
            if (half < LeastHalf)
            {
                toScale = false;
                var wider = LeastHalf / Math.Max(half, 1e-9);
                offset = new Point(offset.X * wider, offset.Y * wider);
                half = LeastHalf;
            }

            upper.Add(new Point(from.X + offset.X, from.Y + offset.Y));
            upper.Add(new Point(to.X + offset.X, to.Y + offset.Y));
            lower.Add(new Point(from.X - offset.X, from.Y - offset.Y));
            lower.Add(new Point(to.X - offset.X, to.Y - offset.Y));
            centres.Add((from, to, half));
        }

        return new PipeOutline(upper, lower, centres, toScale);
    }
}
