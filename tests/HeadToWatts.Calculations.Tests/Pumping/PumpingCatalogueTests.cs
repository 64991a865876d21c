using HeadToWatts.Pumping;

namespace HeadToWatts.Calculations.Tests.Pumping;

/// <summary>What every method of this stage must carry.</summary>
public class PumpingCatalogueTests
{
    [Fact]
    public void The_list_names_each_method_once() => Assert.Equal(PumpingMethods.All.Count, PumpingMethods.All.Select(m => m.Id).Distinct().Count());

    [Fact]
    public void Every_method_has_a_formula_and_a_source() =>
        Assert.All(PumpingMethods.All, m => Assert.True(m.Formula.Length > 0 && m.Source.Title.Length > 0));
}
