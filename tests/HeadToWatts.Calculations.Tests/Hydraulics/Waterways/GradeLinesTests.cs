using CsCheck;
using HeadToWatts.Hydraulics.Friction;
using HeadToWatts.Hydraulics.LocalLosses;
using HeadToWatts.Hydraulics.Waterways;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Waterways;

public class GradeLinesTests
{
    private const double HeadwaterM = 640, TailwaterM = 600;

    [Fact]
    public void Pressure_behind_an_enlargement_equals_printed_examples()
    {
        foreach (var row in CheckRows.With(GradeLines.EnergyEquation.Id, "upstreamPressureKPa"))
        {
            double gravity = row["gravityMPerS2"], weight = row["specificWeightNPerM3"], alpha = row["kineticEnergyCoefficient"];
            double flowM3PerS = row["flowM3PerS"], smallM = row["upstreamDiameterM"], largeM = row["downstreamDiameterM"];
            var site = TestWaterways.Site with { GravityMPerS2 = gravity };

            // Both pipes lie at elevation 0 and have no length; the loss stands at the start of the larger one, on its velocity.
            var onLarge = row["lossCoefficient"] * Math.Pow(largeM / smallM, 4);
            var loss = new Fitting("Enlargement", onLarge, 1, new FittingKind("enlargement", "Enlargement", onLarge, 0, 10, LocalLoss.Method.Source, "") { Place = FittingPlace.Entrance });
            var small = PipeElement.Of("Small", 0, smallM, TestWaterways.Steel) with { EndElevationM = 0 };
            var large = PipeElement.Of("Large", 0, largeM, TestWaterways.Steel, loss) with { EndElevationM = 0 };
            var velocityMPerS = flowM3PerS / small.AreaM2;
            var headwaterM = (row["upstreamPressureKPa"] * 1000 / weight) + (alpha * velocityMPerS * velocityMPerS / (2 * gravity));

            var sections = new Waterway([small, large], FrictionFormulas.Default, alpha).GradeLines(flowM3PerS, headwaterM, -1, site);
            Assert.Equal(row["upstreamPressureKPa"], sections.Single(s => s.Name == "End of Small").PressureHeadM * weight / 1000, 1e-9);
            row.Check(sections.Single(s => s.Name == "Start of Large").PressureHeadM * weight / 1000, "expectedKPa");
        }
    }

    [Fact]
    public void Energy_never_rises_downstream_and_what_is_left_is_the_net_head() =>
        Gen.Select(TestWaterways.Any, Gen.Double[0, 2]).Sample((waterway, flowM3PerS) =>
        {
            var sections = waterway.GradeLines(flowM3PerS, HeadwaterM, TailwaterM, TestWaterways.Site);
            var losses = waterway.At(flowM3PerS, TestWaterways.Site);
            Assert.All(sections.SkipLast(1).Zip(sections.Skip(1).SkipLast(1)), p => Assert.True(p.Second.EnergyGradeM <= p.First.EnergyGradeM));
            Assert.Equal(HeadwaterM, sections[0].EnergyGradeM);
            Assert.Equal(TailwaterM, sections[^1].EnergyGradeM);

            // The machine takes the net head; losses of exits lie behind it.
            var exitM = losses.Elements.SelectMany(e => e.Fittings).Where(f => f.Fitting.Place == FittingPlace.Exit).Sum(f => f.LossM);
            var netHeadM = HeadwaterM - TailwaterM - losses.TotalLossM;
            Assert.Equal(TailwaterM + exitM + netHeadM, sections[^2].EnergyGradeM, 1e-9 * (1 + losses.TotalLossM));
        });

    [Fact]
    public void The_three_terms_make_up_the_energy_at_every_section() =>
        Gen.Select(TestWaterways.Any, Gen.Double[0, 2]).Sample((waterway, flowM3PerS) =>
            Assert.All(waterway.GradeLines(flowM3PerS, HeadwaterM, TailwaterM, TestWaterways.Site), s =>
            {
                Assert.Equal(s.EnergyGradeM, s.CentreElevationM + s.PressureHeadM + s.VelocityHeadM, 1e-9 * (1 + Math.Abs(s.EnergyGradeM)));
                Assert.Equal(s.EnergyGradeM - s.VelocityHeadM, s.HydraulicGradeM, 1e-9 * (1 + Math.Abs(s.EnergyGradeM)));
            }));

    [Fact]
    public void Sections_stand_in_the_order_of_the_flow_with_stations_along_the_pipe()
    {
        var waterway = new Waterway(
            [PipeElement.Of("Canal pipe", 200, 1.2, TestWaterways.Steel, TestWaterways.KindOf("entrance-square")), PipeElement.Of("Penstock", 50, 0.8, TestWaterways.Steel)],
            FrictionFormulas.Default);
        var sections = waterway.GradeLines(1.5, HeadwaterM, TailwaterM, TestWaterways.Site);
        Assert.Equal(
            ["Headwater", "Start of Canal pipe", "End of Canal pipe", "Start of Penstock", "End of Penstock", "Machine", "Tailwater"],
            sections.Select(s => s.Name));
        Assert.Equal([0, 0, 200, 200, 250, 250, 250], sections.Select(s => s.StationM));
    }

    [Fact]
    public void Without_elevations_the_pipe_runs_straight_and_with_them_through_the_given_points()
    {
        var a = PipeElement.Of("A", 100, 1, TestWaterways.Steel);
        var b = PipeElement.Of("B", 300, 0.6, TestWaterways.Steel);
        double[] Centres(params PipeElement[] elements) =>
            [.. new Waterway(elements, FrictionFormulas.Default).GradeLines(0, HeadwaterM, TailwaterM, TestWaterways.Site).Where(s => s.Name.StartsWith("End", StringComparison.Ordinal)).Select(s => s.CentreElevationM)];

        // From 639 m (a diameter under the headwater) to 600.3 m (half the last diameter above the tailwater) over 400 m.
        Assert.Equal([639 - (38.7 / 4), 600.3], Centres(a, b), (x, y) => Math.Abs(x - y) < 1e-9);
        Assert.Equal([620, 600.3], Centres(a with { EndElevationM = 620 }, b), (x, y) => Math.Abs(x - y) < 1e-9);
        Assert.Equal([639 - (37.0 / 4), 602], Centres(a, b with { EndElevationM = 602 }), (x, y) => Math.Abs(x - y) < 1e-9);
    }

    [Fact]
    public void A_summit_above_the_grade_line_shows_as_the_lowest_pressure()
    {
        var waterway = new Waterway(
            [
                PipeElement.Of("To the summit", 100, 0.5, TestWaterways.Steel) with { EndElevationM = 645 },
                PipeElement.Of("Down", 100, 0.5, TestWaterways.Steel),
            ],
            FrictionFormulas.Default);
        var lowest = GradeLines.LowestPressure(waterway.GradeLines(0.4, HeadwaterM, TailwaterM, TestWaterways.Site));
        Assert.NotNull(lowest);
        Assert.Equal(100, lowest.StationM);
        Assert.True(lowest.PressureHeadM < -5);
        Assert.Null(GradeLines.LowestPressure(new Waterway([], FrictionFormulas.Default).GradeLines(1, HeadwaterM, TailwaterM, TestWaterways.Site)));
    }

    [Fact]
    public void Still_water_stands_level_and_its_pressure_is_the_depth()
    {
        var waterway = new Waterway([PipeElement.Of("Penstock", 300, 0.6, TestWaterways.Steel)], FrictionFormulas.Default, 1.2);
        var sections = waterway.GradeLines(0, HeadwaterM, TailwaterM, TestWaterways.Site);
        Assert.All(sections.SkipLast(1), s => Assert.Equal(HeadwaterM, s.HydraulicGradeM, 1e-9));
        Assert.Equal(40 - 0.3, sections[^2].PressureHeadM, 1e-9);
    }
}
