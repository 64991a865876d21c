using HeadToWatts.Hydraulics.Friction;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Friction;

public class ExplicitFormulaTests
{
    [Theory]
    [InlineData("swamee-jain")]
    [InlineData("haaland")]
    [InlineData("churchill")]
    public void Factors_equal_independent_and_printed_values(string id)
    {
        foreach (var row in CheckRows.With(id, "reynolds"))
            row.Check(TestPipes.Factor(id, row["reynolds"], row["relativeRoughness"]));
    }

    // The accuracy each source claims, against the reference formula over its whole range. Haaland's 2 % holds from e/D 1e-6
    // upwards and for smooth pipe; Churchill's own claim is a few per cent near Re 4,000, where the flow is not fully turbulent.
    [Theory]
    [InlineData("swamee-jain", 5e3, 1e8, 1e-6, 1e-2, 0.033)]
    [InlineData("haaland", 4e3, 1e8, 1e-6, 0.05, 0.02)]
    [InlineData("churchill", 1e4, 1e8, 1e-9, 0.05, 0.033)]
    public void Explicit_formulas_agree_with_Colebrook_White_over_their_range(
        string id, double lowestReynolds, double highestReynolds, double smoothest, double roughest, double claimedAccuracy)
    {
        foreach (var reynolds in CheckRows.LogSpan(lowestReynolds, highestReynolds, 120))
        {
            foreach (var roughness in CheckRows.LogSpan(smoothest, roughest, 60))
            {
                var ratio = TestPipes.Factor(id, reynolds, roughness) / TestPipes.Factor("colebrook-white", reynolds, roughness);
                Assert.True(Math.Abs(ratio - 1) <= claimedAccuracy, $"Re {reynolds:R}, e/D {roughness:R}: {ratio:R} of Colebrook-White");
            }
        }
    }

    [Fact]
    public void Only_formulas_with_a_Darcy_factor_report_one_and_the_others_give_an_equivalent()
    {
        var flow = TestPipes.AtReynolds(1e6, 1e-4);
        foreach (var formula in FrictionFormulas.All)
        {
            Assert.Equal(formula is DarcyFormula, formula.FactorOf(flow) is not null);
            var equivalent = formula.EquivalentDarcy(flow).Value;
            Assert.Equal(formula.LossPerMetre(flow), equivalent * flow.VelocityHeadM / flow.DiameterM, 1e-15);
            if (formula.FactorOf(flow) is { } factor)
                Assert.True(Math.Abs((factor.Value / equivalent) - 1) < 1e-12);
        }
    }
}
