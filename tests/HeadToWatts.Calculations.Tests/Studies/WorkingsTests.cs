using HeadToWatts.Basis.Sources;
using HeadToWatts.Basis.Units;
using HeadToWatts.FlowRecords;
using HeadToWatts.Studies;
using HeadToWatts.Studies.Workings;

namespace HeadToWatts.Calculations.Tests.Studies;

public class WorkingsTests
{
    private static readonly string[] Always =
    [
        "duration-curve", "usable-flow", "design-flow", "specific-weight", "gross-head", "net-head", "velocity", "friction", "local-losses",
        "velocity-limit", "surge", "turbine", "specific-speed", "shaft-power", "power", "energy", "plant-factor", "water-balance",
    ];

    private static readonly StudyResult Quiet = TestStudies.Quiet.Run();

    public static TheoryData<string> Sites => new(TestStudies.Sites);

    [Fact]
    public void Every_headline_number_has_its_working()
    {
        var ids = WorkingsList.For(Quiet, Quiet.Show()).Select(w => w.Id).ToList();
        Assert.Equal(ids.Count, ids.Distinct().Count());
        Assert.All([.. Always, "day-by-day", "dry-year"], id => Assert.Contains(id, ids));

        // Without a record there is no dry year; without a pipe nothing of a pipe.
        var bare = TestStudies.Quiet.WithCurve(BeyondLastRow.Hold, new(0, 2.8), new(1, 1.2)).WithPipes().Run();
        Assert.DoesNotContain(WorkingsList.For(bare, bare.Show()), w => w.Id is "dry-year" or "day-by-day" or "velocity" or "friction" or "surge" or "velocity-limit");
        Assert.NotNull(WorkingsList.Find(bare, bare.Show(), "net-head"));
        Assert.Null(WorkingsList.Find(bare, bare.Show(), "friction"));
    }

    [Theory]
    [MemberData(nameof(Sites))]
    public void Each_working_gives_a_formula_the_numbers_a_result_and_sources_that_the_study_lists(string site)
    {
        foreach (var result in TestStudies.RunSite(site))
        {
            foreach (var system in new[] { UnitSystem.US, UnitSystem.SI })
            {
                var workings = WorkingsList.For(result, result.Show(system));
                Assert.True(workings.Count >= 17);
                Assert.Equal(workings.OrderBy(w => w.Stage).Select(w => w.Id), workings.Select(w => w.Id));
                Assert.All(workings, w =>
                {
                    Assert.True(w.Title.Length > 0 && w.Formula.Length > 0 && w.Numbers.Length > 0 && w.Result.Length > 0, w.Id);
                    Assert.NotEmpty(FormulaText.Parse(w.Formula));
                    Assert.All(w.Methods, m => Assert.True(result.MethodsUsed.Any(u => u.Method.Id == m.Id), $"{w.Id} cites {m.Id}, which the study does not list among its methods"));
                });
            }
        }
    }

    [Fact]
    public void The_same_numbers_stand_in_feet_and_in_metres()
    {
        // 50 m are 164 ft, 1.8 m3/s are 63.6 cfs, a pipe of 1 m is 39.4 in: converted by hand.
        Assert.Contains("50.0 m", Working("net-head", UnitSystem.SI).Numbers);
        Assert.Contains("164 ft", Working("net-head", UnitSystem.US).Numbers);
        Assert.Equal("1.80 m3/s", Working("design-flow", UnitSystem.SI).Result);
        Assert.Equal("63.6 cfs", Working("design-flow", UnitSystem.US).Result);
        Assert.Contains("1000 mm", Working("velocity", UnitSystem.SI).Numbers);
        Assert.Contains("39.4 in", Working("velocity", UnitSystem.US).Numbers);

        // 1.8/(pi/4) = 2.2918 m/s = 7.5191 ft/s; 0.125 (2 x 9.80 x 50)^(1/2) = 3.91 m/s = 12.8 ft/s.
        Assert.Equal("2.29 m/s", Working("velocity", UnitSystem.SI).Result);
        Assert.Equal("7.52 ft/s", Working("velocity", UnitSystem.US).Result);
        Assert.Equal("3.91 m/s", Working("velocity-limit", UnitSystem.SI).Result);
        Assert.Equal("12.8 ft/s", Working("velocity-limit", UnitSystem.US).Result);

        // 9 800.2 N/m3 over 157.087 is 62.39 lbf/ft3 (exact definitions: 1 lbf/ft3 = 157.087463846 N/m3).
        Assert.Contains("62.39 lbf/ft3", Working("specific-weight", UnitSystem.US).Result);
    }

    [Fact]
    public void The_numbers_shown_give_the_result_shown()
    {
        // eta gamma Q H of the text, multiplied out from its three-digit figures, is the power shown within their rounding.
        var shaft = Working("shaft-power", UnitSystem.SI);
        var factors = shaft.Numbers.Split('×').Select(Leading).ToArray();
        Assert.Equal(4, factors.Length);
        Assert.Equal(Leading(shaft.Result), factors.Aggregate(1.0, (a, b) => a * b), 0.015 * Leading(shaft.Result));

        var factor = Working("plant-factor", UnitSystem.SI);
        var energy = Quiet.Energy.Annual.AnnualEnergyKwh / Quiet.Energy.Annual.InstalledPowerKw / 8760;
        Assert.Equal(100 * energy, Leading(factor.Result), 0.051);

        static double Leading(string text) =>
            double.Parse(string.Concat(text.Trim().Replace("\u202f", "", StringComparison.Ordinal).TakeWhile(c => char.IsDigit(c) || c == '.')), System.Globalization.CultureInfo.InvariantCulture);
    }

    [Fact]
    public void Methods_used_are_listed_once_in_the_order_of_the_stages_and_stand_in_the_catalogue()
    {
        var ids = Quiet.MethodsUsed.Select(u => u.Method.Id).ToList();
        Assert.Equal(ids.Count, ids.Distinct().Count());
        Assert.All(ids, id => Assert.Contains(StudyMethods.Catalogue, m => m.Id == id));
        Assert.All(["iapws-if97-density", "plotting-position-weibull", "colebrook-white", "water-power", "duration-curve-energy", "plant-factor", "joukowsky"], id => Assert.Contains(id, ids));
        Assert.True(ids.IndexOf("plotting-position-weibull") < ids.IndexOf("colebrook-white"));
        Assert.True(ids.IndexOf("colebrook-white") < ids.IndexOf("water-power"));
    }

    private static Working Working(string id, UnitSystem system) => WorkingsList.Find(Quiet, Quiet.Show(system), id)!;
}
