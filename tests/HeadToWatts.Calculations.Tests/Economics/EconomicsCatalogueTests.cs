using HeadToWatts.Economics;

namespace HeadToWatts.Calculations.Tests.Economics;

/// <summary>What every method of this stage must carry.</summary>
public class EconomicsCatalogueTests
{
    [Fact]
    public void The_list_names_each_method_once() => Assert.Equal(EconomicsMethods.All.Count, EconomicsMethods.All.Select(m => m.Id).Distinct().Count());

    [Fact]
    public void Every_method_has_a_formula_and_a_source() =>
        Assert.All(EconomicsMethods.All, m => Assert.True(m.Formula.Length > 0 && m.Source.Title.Length > 0));
}
