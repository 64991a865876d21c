using HeadToWatts.Hydraulics.LocalLosses;

namespace HeadToWatts.Calculations.Tests.Hydraulics.LocalLosses;

public class FittingKindsTests
{
    // Published ranges: Cengel and Cimbala Ex. 8-8 (entrance 0.5, elbow 0.3, valve 0.2, exit 1.06) as read in a companion solution;
    // Fox and McDonald Ex. 8.8 deduce 0.5 for a square entrance; fluids 1.0.22 after Rennels: sharp entrance 0.57, rounded at
    // r/D 0.05 to 0.2 0.297 to 0.115; after Miller: mitre bends of 30, 45, 60, 90 degrees 0.103, 0.285, 0.508, 1.125;
    // penstock tabulation of the Colorado Water Conservation Board, document 104678: bend 0.25 (angle/90)^0.5, wye 0.75.
    // The others from memory (Design of Small Dams, European small-hydro guide of 2004, textbook tables).
    [Theory]
    [InlineData("entrance-square", 0.5, 0.57)]
    [InlineData("entrance-rounded", 0.115, 0.297)]
    [InlineData("entrance-bell-mouth", 0.03, 0.1)]
    [InlineData("entrance-re-entrant", 0.8, 1.0)]
    [InlineData("elbow-90-flanged", 0.3, 0.3)]
    [InlineData("bend-90", 0.25, 0.25)]
    [InlineData("bend-45", 0.17, 0.185)]
    [InlineData("wye", 0.75, 0.75)]
    [InlineData("mitre-30", 0.098, 0.108)]
    [InlineData("mitre-45", 0.28, 0.295)]
    [InlineData("mitre-60", 0.48, 0.53)]
    [InlineData("mitre-90", 1.07, 1.18)]
    [InlineData("valve-gate", 0.1, 0.2)]
    [InlineData("valve-butterfly", 0.15, 0.3)]
    [InlineData("valve-ball", 0.05, 0.05)]
    [InlineData("exit", 1.0, 1.06)]
    public void Usual_coefficients_lie_in_the_published_ranges(string id, double lowest, double highest) =>
        Assert.InRange(FittingKinds.Find(id)!.LossCoefficient, lowest, highest);

    [Fact]
    public void Every_kind_has_an_id_of_its_own_and_its_usual_value_within_its_range()
    {
        Assert.Equal(FittingKinds.All.Count, FittingKinds.All.Select(k => k.Id).Distinct().Count());
        Assert.All(FittingKinds.All, k => Assert.InRange(k.LossCoefficient, k.Lowest, k.Highest));
    }

    [Fact]
    public void Kinds_are_found_by_id_or_name()
    {
        Assert.All(FittingKinds.All, k =>
        {
            Assert.Same(k, FittingKinds.Find(k.Id.ToUpperInvariant()));
            Assert.Same(k, FittingKinds.Find(k.Name));
        });
        Assert.Null(FittingKinds.Find("no such fitting"));
    }

    [Fact]
    public void A_fitting_of_a_kind_takes_its_usual_coefficient_once_for_each()
    {
        var fitting = Fitting.Of(FittingKinds.Find("bend-90")!, 3);
        Assert.Equal(0.75, fitting.TotalLossCoefficient, 1e-12);
        Assert.Throws<ArgumentOutOfRangeException>(() => Fitting.Of(FittingKinds.All[0], 0));
    }
}
