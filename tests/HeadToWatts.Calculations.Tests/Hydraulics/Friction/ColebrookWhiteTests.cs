using CsCheck;
using HeadToWatts.Hydraulics.Friction;
using MathNet.Numerics.RootFinding;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Friction;

public class ColebrookWhiteTests
{
    [Fact]
    public void Factors_equal_independent_and_printed_values()
    {
        foreach (var row in CheckRows.With("colebrook-white", "reynolds"))
            row.Check(TestPipes.Factor("colebrook-white", row["reynolds"], row["relativeRoughness"]));
    }

    [Fact]
    public void The_root_is_exact_to_1e_12_over_the_whole_range()
    {
        double[] roughnesses = [0, .. CheckRows.LogSpan(1e-9, 0.05, 60)];
        foreach (var reynolds in CheckRows.LogSpan(4000, 1e8, 90))
        {
            foreach (var roughness in roughnesses)
                AssertIsRoot(reynolds, roughness);
        }
    }

    [Fact]
    public void The_root_is_exact_to_1e_12_anywhere() =>
        Gen.Select(Gen.Double[Math.Log(4000), Math.Log(1e8)], Gen.Double[0, 0.05])
            .Sample((logReynolds, roughness) => AssertIsRoot(Math.Exp(logReynolds), roughness));

    [Fact]
    public void The_formula_names_its_range_and_reports_leaving_it()
    {
        var formula = TestPipes.Formula("colebrook-white");
        var inside = TestPipes.AtReynolds(1e6, 1e-4);
        var rough = TestPipes.AtReynolds(1e6, 0.06);
        Assert.All(formula.UsesBetween(inside, inside), u => Assert.Empty(u.OutOfRange()));
        var (range, _) = Assert.Single(formula.UsesBetween(rough, rough).SelectMany(u => u.OutOfRange()));
        Assert.Equal("e/D", range.Symbol);
    }

    private static void AssertIsRoot(double reynolds, double relativeRoughness)
    {
        // Brent on x = 1/sqrt(f), which lies between 1 and 20 for every pipe.
        var x = Brent.FindRoot(v => v + (2 * Math.Log10((relativeRoughness / 3.7) + (2.51 * v / reynolds))), 1, 20, 1e-15, 500);
        var factor = TestPipes.Factor("colebrook-white", reynolds, relativeRoughness);
        Assert.True(Math.Abs((factor * x * x) - 1) <= 1e-12, $"Re {reynolds:R}, e/D {relativeRoughness:R}: {factor:R} against {1 / (x * x):R}");
    }
}
