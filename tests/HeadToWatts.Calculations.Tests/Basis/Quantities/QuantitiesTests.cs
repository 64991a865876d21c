using HeadToWatts.Basis.Quantities;

namespace HeadToWatts.Calculations.Tests.Basis.Quantities;

public class QuantitiesTests
{
    [Theory]
    [InlineData(double.NaN)]
    [InlineData(0)]
    [InlineData(-3)]
    [InlineData(2500.1)]
    [InlineData(double.PositiveInfinity)]
    public void A_gross_head_outside_its_range_is_refused(double metres) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => GrossHead.FromMetres(metres));

    [Theory]
    [InlineData(double.NaN)]
    [InlineData(-0.01)]
    [InlineData(1.01)]
    [InlineData(85)]
    public void An_efficiency_is_a_ratio_and_not_a_percentage(double ratio) =>
        Assert.Throws<ArgumentOutOfRangeException>(() => Efficiency.FromRatio(ratio));

    [Fact]
    public void A_darcy_factor_is_four_times_fannings()
    {
        // Dixon, Ex. 9.1, prints Fanning's 0.01 where Darcy's is 0.04.
        Assert.Equal(0.01, DarcyFrictionFactor.FromDarcy(0.04).Fanning, 1e-15);
        Assert.Throws<ArgumentOutOfRangeException>(() => DarcyFrictionFactor.FromDarcy(double.NaN));
        Assert.Throws<ArgumentOutOfRangeException>(() => DarcyFrictionFactor.FromDarcy(-1));
    }
}
