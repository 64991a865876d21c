using CsCheck;
using HeadToWatts.Turbines;

namespace HeadToWatts.Calculations.Tests.Turbines;

public class HeadFlowEnvelopeTests
{
    // One decade square on logarithmic paper: 1 to 10 m3/s by 1 to 10 m.
    private static readonly HeadFlowEnvelope Square = HeadFlowEnvelope.FromVertices(new(1, 1), new(10, 1), new(10, 10), new(1, 10));

    private static readonly Gen<(double X, double Y)> Anywhere = Gen.Select(Gen.Double[-4, 4], Gen.Double[-1, 4]);

    [Theory]
    // Distances on logarithmic paper by Pythagoras.
    [InlineData(100, 5, 1)]
    [InlineData(0.1, 5, 1)]
    [InlineData(5, 1000, 2)]
    [InlineData(100, 100, 1.4142135623730951)]
    [InlineData(0.1, 1000, 2.23606797749979)]
    public void The_distance_outside_is_in_decades(double flow, double head, double decades)
    {
        var fit = Square.Fit(flow, head);
        Assert.False(fit.IsInside);
        Assert.Equal(decades, fit.DecadesOutside, 1e-12);
    }

    [Fact]
    public void Inside_the_distance_is_zero_and_the_limits_are_those_of_the_sides()
    {
        var fit = Square.Fit(2, 5);
        Assert.True(fit.IsInside);
        Assert.Equal(0, fit.DecadesOutside);
        Assert.Equal(1, fit.LowestHeadAtFlowM!.Value, 1e-12);
        Assert.Equal(10, fit.HighestHeadAtFlowM!.Value, 1e-12);
        Assert.Equal(1, fit.LowestFlowAtHeadM3PerS!.Value, 1e-12);
        Assert.Equal(10, fit.HighestFlowAtHeadM3PerS!.Value, 1e-12);
    }

    [Fact]
    public void Outside_the_limits_say_by_how_much()
    {
        var low = Square.Fit(2, 0.4);
        Assert.Equal(0.4, 0.4 / low.LowestHeadAtFlowM!.Value, 1e-12);
        Assert.Null(low.LowestFlowAtHeadM3PerS);
        Assert.Null(low.HighestFlowAtHeadM3PerS);
        Assert.Equal(2, low.NearestPoint.FlowM3PerS, 1e-12);
        Assert.Equal(1, low.NearestPoint.HeadM, 1e-12);
    }

    [Fact]
    public void Corners_and_sides_are_inside()
    {
        foreach (var type in TurbineTypes.All)
        {
            var corners = type.Envelope.Vertices;
            for (var i = 0; i < corners.Count; i++)
            {
                var next = corners[(i + 1) % corners.Count];
                Assert.True(type.Envelope.Contains(corners[i].FlowM3PerS, corners[i].HeadM));
                Assert.True(type.Envelope.Contains(Math.Sqrt(corners[i].FlowM3PerS * next.FlowM3PerS), Math.Sqrt(corners[i].HeadM * next.HeadM)));
            }
        }
    }

    [Fact]
    public void Inside_agrees_with_counting_the_sides_above_the_point()
    {
        // An independent rule: a ray upwards crosses the outline an odd number of times from inside.
        Anywhere.Sample(point =>
        {
            var (x, y) = point;
            foreach (var type in TurbineTypes.All)
            {
                var fit = type.Envelope.Fit(Math.Pow(10, x), Math.Pow(10, y));
                if (Distance(type.Envelope, x, y) < 1e-6)
                    continue;
                Assert.Equal(SidesAbove(type.Envelope, x, y) % 2 == 1, fit.IsInside);
                Assert.Equal(fit.IsInside, type.Envelope.Contains(Math.Pow(10, x), Math.Pow(10, y)));
            }
        });
    }

    [Fact]
    public void The_distance_is_continuous_and_zero_exactly_inside()
    {
        Gen.Select(Anywhere, Anywhere).Sample((p, q) =>
        {
            foreach (var type in TurbineTypes.All)
            {
                var a = type.Envelope.Fit(Math.Pow(10, p.X), Math.Pow(10, p.Y));
                var b = type.Envelope.Fit(Math.Pow(10, q.X), Math.Pow(10, q.Y));
                Assert.Equal(a.IsInside, a.DecadesOutside == 0);
                // The distance to a set changes by no more than the step taken.
                Assert.True(Math.Abs(a.DecadesOutside - b.DecadesOutside) <= Math.Sqrt(Math.Pow(p.X - q.X, 2) + Math.Pow(p.Y - q.Y, 2)) + 1e-9);
            }
        });
    }

    [Fact]
    public void The_nearest_point_lies_on_the_outline_at_the_stated_distance()
    {
        Anywhere.Sample(point =>
        {
            foreach (var type in TurbineTypes.All)
            {
                var fit = type.Envelope.Fit(Math.Pow(10, point.X), Math.Pow(10, point.Y));
                var (nx, ny) = (Math.Log10(fit.NearestPoint.FlowM3PerS), Math.Log10(fit.NearestPoint.HeadM));
                Assert.True(Distance(type.Envelope, nx, ny) < 1e-9);
                if (!fit.IsInside)
                    Assert.Equal(fit.DecadesOutside, Math.Sqrt(Math.Pow(point.X - nx, 2) + Math.Pow(point.Y - ny, 2)), 1e-9);
            }
        });
    }

    [Fact]
    public void Nothing_changes_when_flow_and_head_are_told_in_other_units()
    {
        Gen.Select(Anywhere, Gen.Double[-2, 2], Gen.Double[-2, 2]).Sample((point, a, b) =>
        {
            var (kq, kh) = (Math.Pow(10, a), Math.Pow(10, b));
            var (flow, head) = (Math.Pow(10, point.X), Math.Pow(10, point.Y));
            foreach (var type in TurbineTypes.All)
            {
                var scaled = HeadFlowEnvelope.FromVertices([.. type.Envelope.Vertices.Select(v => new EnvelopeVertex(kq * v.FlowM3PerS, kh * v.HeadM))]);
                var plain = type.Envelope.Fit(flow, head);
                var other = scaled.Fit(kq * flow, kh * head);
                Assert.Equal(plain.DecadesOutside, other.DecadesOutside, 1e-9);
            }
        });
    }

    [Fact]
    public void A_head_inside_lies_between_the_limits_at_its_flow()
    {
        Anywhere.Sample(point =>
        {
            var (flow, head) = (Math.Pow(10, point.X), Math.Pow(10, point.Y));
            foreach (var type in TurbineTypes.All)
            {
                var fit = type.Envelope.Fit(flow, head);
                if (!fit.IsInside)
                    continue;
                Assert.InRange(head, fit.LowestHeadAtFlowM!.Value * (1 - 1e-8), fit.HighestHeadAtFlowM!.Value * (1 + 1e-8));
                Assert.InRange(flow, fit.LowestFlowAtHeadM3PerS!.Value * (1 - 1e-8), fit.HighestFlowAtHeadM3PerS!.Value * (1 + 1e-8));
            }
        });
    }

    [Theory]
    [InlineData(0)]
    [InlineData(-1)]
    [InlineData(double.NaN)]
    [InlineData(double.PositiveInfinity)]
    public void What_has_no_place_on_logarithmic_paper_is_refused(double value)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => Square.Contains(value, 1));
        Assert.Throws<ArgumentOutOfRangeException>(() => Square.Fit(1, value));
        Assert.Throws<ArgumentOutOfRangeException>(() => HeadFlowEnvelope.FromVertices(new(1, 1), new(2, 1), new(value, 3)));
    }

    [Fact]
    public void Outlines_without_area_are_refused()
    {
        Assert.Throws<ArgumentException>(() => HeadFlowEnvelope.FromVertices(new(1, 1), new(10, 10)));
        Assert.Throws<ArgumentException>(() => HeadFlowEnvelope.FromVertices(new(1, 1), new(10, 10), new(100, 100)));
    }

    private static int SidesAbove(HeadFlowEnvelope envelope, double x, double y)
    {
        var count = 0;
        foreach (var ((x1, y1), (x2, y2)) in Sides(envelope))
        {
            if (x1 <= x == x2 <= x)
                continue;
            if (y1 + ((x - x1) / (x2 - x1) * (y2 - y1)) > y)
                count++;
        }

        return count;
    }

    // Distance to the outline by a fine walk along each side, refined by golden section.
    private static double Distance(HeadFlowEnvelope envelope, double x, double y)
    {
        var least = double.PositiveInfinity;
        foreach (var ((x1, y1), (x2, y2)) in Sides(envelope))
        {
            double At(double t) => Math.Pow(x1 + (t * (x2 - x1)) - x, 2) + Math.Pow(y1 + (t * (y2 - y1)) - y, 2);
            var (low, high) = (0.0, 1.0);
            for (var i = 0; i < 200; i++)
            {
                var (a, b) = (low + (0.381966 * (high - low)), low + (0.618034 * (high - low)));
                if (At(a) < At(b))
                    high = b;
                else
                    low = a;
            }

            least = Math.Min(least, Math.Min(At((low + high) / 2), Math.Min(At(0), At(1))));
        }

        return Math.Sqrt(least);
    }

    private static IEnumerable<((double X, double Y) From, (double X, double Y) To)> Sides(HeadFlowEnvelope envelope)
    {
        var points = envelope.Vertices.Select(v => (Math.Log10(v.FlowM3PerS), Math.Log10(v.HeadM))).ToList();
        for (var i = 0; i < points.Count; i++)
            yield return (points[i], points[(i + 1) % points.Count]);
    }
}
