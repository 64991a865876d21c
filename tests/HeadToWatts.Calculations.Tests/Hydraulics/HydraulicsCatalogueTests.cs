using HeadToWatts.Hydraulics;

namespace HeadToWatts.Calculations.Tests.Hydraulics;

public class HydraulicsCatalogueTests
{
    [Fact]
    public void Every_method_has_expected_values_from_outside() =>
        Assert.All(HydraulicsMethods.All, m => Assert.NotEmpty(CheckValueFile.OfMethod(m.Id).SelectMany(f => f.Rows)));

    [Fact]
    public void Every_method_has_an_id_of_its_own_a_formula_and_a_source()
    {
        Assert.Equal(HydraulicsMethods.All.Count, HydraulicsMethods.All.Select(m => m.Id).Distinct().Count());
        Assert.All(HydraulicsMethods.All, m => Assert.True(m.Formula.Length > 0 && m.Source.Title.Length > 0));
    }

    [Fact]
    public void Sources_with_the_same_id_say_the_same() =>
        Assert.All(HydraulicsMethods.All.Select(m => m.Source).GroupBy(s => s.Id), g => Assert.Single(g.Distinct()));
}
