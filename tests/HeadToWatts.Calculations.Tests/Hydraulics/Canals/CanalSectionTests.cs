using CsCheck;
using HeadToWatts.Hydraulics.Canals;
using HeadToWatts.Hydraulics.Canals.Sections;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Canals;

public class CanalSectionTests
{
    // Two identities of any section: the area grows by the top width, the first moment by the area.
    [Fact]
    public void Area_grows_by_the_top_width_and_the_first_moment_by_the_area() =>
        Gen.Select(TestCanals.Any, Gen.Double[0.05, 0.95]).Sample((section, share) =>
        {
            var depthM = share * Math.Min(section.FullDepthM, 5);
            const double stepM = 1e-5;
            var (below, at, above) = (section.At(depthM - stepM), section.At(depthM), section.At(depthM + stepM));
            Assert.Equal(at.TopWidthM, (above.AreaM2 - below.AreaM2) / (2 * stepM), 3e-5 * (1 + at.TopWidthM));
            Assert.Equal(at.AreaM2, (above.FirstMomentM3 - below.FirstMomentM3) / (2 * stepM), 1e-6 * (1 + at.AreaM2));
            Assert.True(above.WettedPerimeterM > at.WettedPerimeterM);
        });

    [Fact]
    public void A_surveyed_section_equals_the_sum_of_its_narrow_strips()
    {
        foreach (var row in CheckRows.Of(UniformFlow.Method.Id, "natural-numpy"))
        {
            var wetted = TestCanals.Surveyed.At(row["depthM"]);
            row.Check(row.Text("quantity") switch
            {
                "area" => wetted.AreaM2,
                "wetted perimeter" => wetted.WettedPerimeterM,
                "top width" => wetted.TopWidthM,
                "first moment" => wetted.FirstMomentM3,
                var other => throw new InvalidOperationException(other),
            });
        }
    }

    [Fact]
    public void A_survey_of_a_trapezium_equals_the_trapezium() =>
        Gen.Select(Gen.Double[0.5, 10], Gen.Double[0, 3], Gen.Double[0.1, 2.9]).Sample((bedM, side, depthM) =>
        {
            var surveyed = NaturalSection.FromPoints([new(0, 3), new(3 * side, 0), new((3 * side) + bedM, 0), new((6 * side) + bedM, 3)], "section").Value;
            var (a, b) = (surveyed.At(depthM), new TrapezoidalSection(bedM, side).At(depthM));
            Assert.Equal(b.AreaM2, a.AreaM2, 1e-11 * b.AreaM2);
            Assert.Equal(b.WettedPerimeterM, a.WettedPerimeterM, 1e-11 * b.WettedPerimeterM);
            Assert.Equal(b.TopWidthM, a.TopWidthM, 1e-11 * b.TopWidthM);
            Assert.Equal(b.FirstMomentM3, a.FirstMomentM3, 1e-11 * b.FirstMomentM3);
        });

    [Fact]
    public void A_full_pipe_is_a_circle_and_a_thin_film_keeps_its_digits()
    {
        var pipe = new CircularSection(1.2);
        var full = pipe.At(1.2);
        Assert.Equal(Math.PI * 0.36, full.AreaM2, 1e-13);
        Assert.Equal(Math.PI * 1.2, full.WettedPerimeterM, 1e-13);
        Assert.Equal(0, full.TopWidthM, 1e-7);
        Assert.Equal(Math.PI * 0.36 * 0.6, full.FirstMomentM3, 1e-13);
        // A film is a parabola: A = (2/3) T y to the first order.
        var film = pipe.At(1e-7);
        Assert.Equal(film.TopWidthM * 1e-7 * 2 / 3, film.AreaM2, 1e-6 * film.AreaM2);
    }

    [Fact]
    public void Every_fault_of_a_survey_is_named()
    {
        var backwards = NaturalSection.FromPoints([new(0, 2), new(3, 0), new(2, 1), new(double.NaN, 2)], "section");
        Assert.Equal(2, backwards.Problems.Count);
        Assert.Contains("point 3", backwards.Problems[0].Where, StringComparison.Ordinal);
        Assert.Single(NaturalSection.FromPoints([new(0, 2), new(3, 0)], "section").Problems);
        Assert.Contains("holds no water", NaturalSection.FromPoints([new(0, 0), new(3, 1), new(5, 2)], "section").Problems[0].Why, StringComparison.Ordinal);
        Assert.Equal(2, NaturalSection.FromPoints([new(0, 2), new(1, 0), new(4, 3)], "section").Value.FullDepthM);
    }

    [Fact]
    public void Impossible_measures_and_depths_are_refused()
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => new RectangularSection(0));
        Assert.Throws<ArgumentOutOfRangeException>(() => new RectangularSection(double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => new TrapezoidalSection(0, 0));
        Assert.Throws<ArgumentOutOfRangeException>(() => new TrapezoidalSection(1, -1));
        Assert.Throws<ArgumentOutOfRangeException>(() => new CircularSection(double.PositiveInfinity));
        Assert.Throws<ArgumentOutOfRangeException>(() => new CircularSection(1).At(1.01));
        Assert.Throws<ArgumentOutOfRangeException>(() => new RectangularSection(1).At(double.PositiveInfinity));
        Assert.Throws<ArgumentOutOfRangeException>(() => new RectangularSection(1).At(double.NaN));
    }

    [Fact]
    public void Every_shape_is_in_the_list()
    {
        CanalSection[] shapes = [new RectangularSection(1), new TrapezoidalSection(1, 1), new CircularSection(1), TestCanals.Surveyed];
        Assert.Equal(CanalSectionKinds.All.Select(k => k.Id), shapes.Select(s => s.KindId));
        var types = typeof(CanalSection).Assembly.GetTypes().Where(t => t.IsSubclassOf(typeof(CanalSection)));
        Assert.Equal(CanalSectionKinds.All.Count, types.Count());
        Assert.NotNull(CanalSectionKinds.Find("Natural"));
    }
}
