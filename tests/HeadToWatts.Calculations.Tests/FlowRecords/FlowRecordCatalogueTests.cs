using HeadToWatts.FlowRecords;

namespace HeadToWatts.Calculations.Tests.FlowRecords;

public sealed class FlowRecordCatalogueTests
{
    [Fact]
    public void Every_method_has_expected_values_from_outside() =>
        Assert.All(FlowRecordMethods.All, m => Assert.NotEmpty(CheckValueFile.OfMethod(m.Id).SelectMany(f => f.Rows)));

    [Fact]
    public void Every_method_has_an_id_of_its_own_a_formula_and_a_source()
    {
        Assert.Equal(FlowRecordMethods.All.Count, FlowRecordMethods.All.Select(m => m.Id).Distinct().Count());
        Assert.All(FlowRecordMethods.All, m => Assert.True(m.Formula.Length > 0 && m.Source.Title.Length > 0));
    }

    // A value from memory may support the others of its method but never stand alone.
    [Fact]
    public void No_method_rests_on_values_from_memory_alone() =>
        Assert.All(FlowRecordMethods.All, m => Assert.Contains(CheckValueFile.OfMethod(m.Id), f => !f.Path.Contains("from-memory", StringComparison.Ordinal)));
}
