using HeadToWatts.Basis.Sources;
using HeadToWatts.Turbines;

namespace HeadToWatts.Calculations.Tests.Turbines;

public class TurbineTypesTests
{
    private const double FootM = 0.3048;
    private const double CubicFootM3 = FootM * FootM * FootM;

    [Fact]
    public void The_nine_types_are_listed()
    {
        Assert.Equal(
            ["pelton", "turgo", "crossflow", "francis", "kaplan", "propeller", "screw", "water-wheel", "pump-as-turbine"],
            TurbineTypes.All.Select(t => t.Id));
    }

    [Fact]
    public void A_type_in_a_folder_of_its_own_is_in_the_list()
    {
        var declared = typeof(TurbineTypes).Assembly.GetTypes()
            .SelectMany(t => t.GetProperties())
            .Where(p => p.PropertyType == typeof(TurbineType) && p.GetMethod!.IsStatic)
            .Select(p => (TurbineType)p.GetValue(null)!)
            .ToList();
        Assert.Equal(TurbineTypes.All.Count, declared.Count);
        Assert.All(declared, type => Assert.Contains(type, TurbineTypes.All));
    }

    [Fact]
    public void A_type_is_found_by_id_and_by_name()
    {
        foreach (var type in TurbineTypes.All)
        {
            Assert.Same(type, TurbineTypes.Find(type.Id));
            Assert.Same(type, TurbineTypes.Find(" " + type.Name.ToUpperInvariant() + " "));
        }

        Assert.Null(TurbineTypes.Find("windmill"));
    }

    [Fact]
    public void Every_type_is_complete_and_every_figure_has_a_source()
    {
        foreach (var type in TurbineTypes.All)
        {
            foreach (var figure in Enum.GetValues<TurbineFigure>())
                Assert.True(type.Sources.Any(s => s.Figure == figure), $"{type.Name}: no source of {figure}");
            Assert.All([type.Uses, type.Limits, type.AtLowFlow], text => Assert.True(text.Length > 20 && text.EndsWith('.'), $"{type.Name}: '{text}'"));
            Assert.InRange(type.LeastFlowRatio, 0.05, 0.9);
            Assert.True(type.Efficiency.Points[0].FlowRatio <= type.LeastFlowRatio, $"{type.Name}: the efficiency curve starts above the least flow");
            Assert.InRange(type.Efficiency.Peak, 0.6, 0.95);
            Assert.True(type.SpecificSpeed.LowestKwM < type.SpecificSpeed.HighestKwM);
            Assert.True(type.Runaway.Lowest > 1 && type.Runaway.Highest >= type.Runaway.Lowest);
        }
    }

    [Fact]
    public void Sources_with_the_same_key_are_the_same_source()
    {
        var sources = TurbineTypes.All.SelectMany(t => t.Sources).Select(s => s.Source)
            .Concat(TurbineMethods.All.Select(m => m.Source)).Distinct().ToList();
        Assert.Equal(sources.Count, sources.Select(s => s.Id).Distinct().Count());
        Assert.Contains(sources, s => s.Kind == SourceKind.Published);
    }

    [Fact]
    public void Every_method_has_expected_values_from_outside()
    {
        foreach (var method in TurbineMethods.All)
        {
            var files = CheckValueFile.OfMethod(method.Id);
            Assert.True(files.Any(f => !f.Head["source"].Contains("from memory", StringComparison.Ordinal)), method.Id);
            Assert.All(files, f => Assert.NotEmpty(f.Rows));
        }
    }

    [Fact]
    public void Every_method_of_the_project_is_in_the_list()
    {
        var declared = typeof(TurbineMethods).Assembly.GetTypes()
            .SelectMany(t => t.GetProperties())
            .Where(p => p.PropertyType == typeof(Method) && p.GetMethod!.IsStatic)
            .Select(p => (Method)p.GetValue(null)!)
            .ToList();
        Assert.Equal(TurbineMethods.All.Select(m => m.Id).Order(), declared.Select(m => m.Id).Order());
    }

    [Theory]
    // Note on turbine types (Scribd 624851128), a secondary source.
    [InlineData("kaplan", 2, 40)]
    [InlineData("francis", 25, 350)]
    [InlineData("pelton", 50, 1300)]
    [InlineData("crossflow", 2, 200)]
    [InlineData("turgo", 50, 250)]
    // Hong Kong EMSD, turbine types.
    [InlineData("propeller", 2, 30)]
    // Eco Evolution, a supplier's page.
    [InlineData("screw", 1, 10)]
    // Small-hydro literature, from memory: overshot wheel 2.5 to 10 m; breastshot wheels reach lower.
    [InlineData("water-wheel", 2.5, 10)]
    // From memory: 10 m to above 100 m.
    [InlineData("pump-as-turbine", 10, 100)]
    public void An_envelope_spans_the_published_heads_and_not_much_more(string id, double lowestM, double highestM)
    {
        var heads = TurbineTypes.Find(id)!.Envelope.Vertices.Select(v => v.HeadM).ToList();
        Assert.InRange(heads.Min(), lowestM / 2.1, lowestM);
        Assert.InRange(heads.Max(), highestM, highestM * 2);
    }

    [Theory]
    // Metric table (electricalengineering.xyz), specific speeds in metric hp, printed there as rpm.
    [InlineData("francis", 60, 400)]
    [InlineData("kaplan", 300, 1100)]
    [InlineData("propeller", 300, 1100)]
    public void Bands_of_specific_speed_are_the_published_ones(string id, double lowestMetricHp, double highestMetricHp)
    {
        var band = TurbineTypes.Find(id)!.SpecificSpeed;
        Assert.Equal(lowestMetricHp, SpecificSpeed.MetricHpMFromKwM(band.LowestKwM), 0.01 * lowestMetricHp);
        Assert.Equal(highestMetricHp, SpecificSpeed.MetricHpMFromKwM(band.HighestKwM), 0.01 * highestMetricHp);
    }

    [Fact]
    public void Impulse_wheels_stay_within_the_published_specific_speeds()
    {
        // Britannica, Turbine: impulse 1 to 20 in hp and ft, for the wheel with all its jets; Francis 10 to 90.
        foreach (var type in new[] { TurbineTypes.Find("pelton")!, TurbineTypes.Find("turgo")! })
        {
            Assert.True(SpecificSpeed.UsHpFtFromKwM(type.SpecificSpeed.LowestKwM) >= 1);
            Assert.True(SpecificSpeed.UsHpFtFromKwM(type.SpecificSpeed.HighestKwM) <= 20);
        }

        var francis = TurbineTypes.Find("francis")!.SpecificSpeed;
        Assert.True(SpecificSpeed.UsHpFtFromKwM(francis.LowestKwM) >= 10 && SpecificSpeed.UsHpFtFromKwM(francis.HighestKwM) <= 90.5);
    }

    [Theory]
    // Note on runaway speeds (Scribd 423881188).
    [InlineData("pelton", 1.8, 1.9)]
    [InlineData("francis", 2.0, 2.2)]
    [InlineData("kaplan", 2.5, 3.0)]
    // ESHA 2004 and textbooks, from memory.
    [InlineData("turgo", 1.8, 1.9)]
    [InlineData("crossflow", 1.8, 2.0)]
    [InlineData("propeller", 1.8, 2.6)]
    [InlineData("pump-as-turbine", 1.3, 1.7)]
    public void Runaway_ratios_are_the_published_ones(string id, double lowest, double highest) =>
        Assert.Equal(new RunawayRatio(lowest, highest), TurbineTypes.Find(id)!.Runaway);

    [Theory]
    // Mukerian III canal drops, Punjab (utility's project page): 274 m3/s at 4.20 m and 277.12 m3/s at 5.32 m, by one to four units.
    [InlineData(274, 4.20)]
    [InlineData(277.12, 5.32)]
    // TP Link canal fall, Punjab.
    [InlineData(260, 4.2)]
    // A Klamath canal drop, as first built: 550 cfs at 22 ft.
    [InlineData(550 * CubicFootM3, 22 * FootM)]
    public void Canal_plants_as_built_fall_in_the_Kaplan_envelope(double flowM3PerS, double headM)
    {
        for (var units = 1; units <= 4; units++)
            Assert.True(TurbineTypes.Find("kaplan")!.Envelope.Contains(flowM3PerS / units, headM));
    }

    [Theory]
    // Common practice, no source: sites a farm or a district has, and the types a practitioner would look at.
    [InlineData(0.01, 60, "pelton")]
    [InlineData(0.01, 60, "turgo")]
    [InlineData(6, 4, "kaplan")]
    [InlineData(6, 4, "propeller")]
    [InlineData(6, 4, "screw")]
    [InlineData(6, 4, "crossflow")]
    [InlineData(110, 4.5, "kaplan")]
    [InlineData(0.3, 40, "francis")]
    [InlineData(0.3, 40, "pump-as-turbine")]
    [InlineData(0.3, 40, "crossflow")]
    [InlineData(0.3, 4, "water-wheel")]
    // Note on turbine types (Scribd 624851128): a crossflow at 13 m and 1 m3/s.
    [InlineData(1, 13, "crossflow")]
    // A screw of the Flights Mill scheme: 3.25 m3/s at 1.6 m (flightsmillhydro.co.uk, technical data).
    [InlineData(3.25, 1.6, "screw")]
    public void Sites_fall_in_the_envelope_of_the_types_that_suit_them(double flowM3PerS, double headM, string id) =>
        Assert.True(TurbineTypes.Find(id)!.Envelope.Contains(flowM3PerS, headM));

    [Theory]
    // Common practice, no source: what no practitioner would put there.
    [InlineData(6, 4, "pelton")]
    [InlineData(6, 4, "turgo")]
    [InlineData(6, 4, "francis")]
    [InlineData(0.01, 60, "kaplan")]
    [InlineData(0.01, 60, "screw")]
    [InlineData(110, 4.5, "crossflow")]
    [InlineData(110, 4.5, "screw")]
    [InlineData(0.02, 300, "francis")]
    [InlineData(0.02, 300, "water-wheel")]
    public void Sites_fall_outside_the_envelope_of_the_types_that_do_not(double flowM3PerS, double headM, string id) =>
        Assert.False(TurbineTypes.Find(id)!.Envelope.Contains(flowM3PerS, headM));

    [Fact]
    public void The_fixed_machines_are_shut_down_first_when_flow_falls()
    {
        // Common practice, no source: propeller and pump have no turndown; Kaplan, crossflow and Pelton hold to 10 to 30 percent.
        Assert.All(new[] { "propeller", "pump-as-turbine" }, id => Assert.True(TurbineTypes.Find(id)!.LeastFlowRatio >= 0.7));
        Assert.All(new[] { "kaplan", "crossflow", "pelton" }, id => Assert.InRange(TurbineTypes.Find(id)!.LeastFlowRatio, 0.1, 0.3));
    }
}
