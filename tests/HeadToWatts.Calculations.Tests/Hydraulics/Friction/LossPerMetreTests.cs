using HeadToWatts.Hydraulics.Friction;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Friction;

public class LossPerMetreTests
{
    public static TheoryData<string> Ids => [.. FrictionFormulas.All.Select(f => f.Id)];

    [Fact]
    public void Darcy_Weisbach_losses_equal_independent_values()
    {
        foreach (var row in CheckRows.With("darcy-weisbach", "quantity"))
        {
            var flow = new PipeFlow(
                row["flowM3PerS"], row["diameterM"], row["roughnessMm"] * 1e-3, 140, 0.012, row["kinematicViscosityM2PerS"], row["gravityMPerS2"]);
            row.Check(row.Text("quantity") == "reynolds" ? flow.Reynolds : FrictionFormulas.Default.LossPerMetre(flow) * row["lengthM"]);
        }
    }

    [Fact]
    public void Darcy_Weisbach_losses_equal_printed_examples()
    {
        foreach (var row in CheckRows.With("darcy-weisbach", "darcyFrictionFactor"))
        {
            double diameterM = row["diameterM"], velocityMPerS = row["velocityMPerS"];
            var flow = new PipeFlow(velocityMPerS * Math.PI / 4 * diameterM * diameterM, diameterM, 0, 140, 0.012, 1e-6, row["gravityMPerS2"]);
            var formula = new GivenFactor(row["darcyFrictionFactor"]);
            row.Check((formula.LossPerMetre(flow) * row["lengthM"]) + (row["lossCoefficient"] * flow.VelocityHeadM));
        }
    }

    [Theory]
    [InlineData("hazen-williams")]
    [InlineData("manning")]
    public void Losses_by_coefficient_equal_independent_and_printed_values(string id)
    {
        foreach (var row in CheckRows.With(id, "coefficient"))
        {
            var flow = new PipeFlow(row["flowM3PerS"], row["diameterM"], 1e-4, row["coefficient"], row["coefficient"], 1e-6, 9.81);
            row.Check(TestPipes.Formula(id).LossPerMetre(flow) * row["lengthM"]);
        }
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void The_loss_rises_with_flow_for_every_formula(string id)
    {
        var formula = TestPipes.Formula(id);
        foreach (var roughness in new[] { 0, 1e-5, 1e-3, 0.05 })
        {
            double[] losses = [0, .. CheckRows.LogSpan(1e-6, 1e8, 4000).Select(re => formula.LossPerMetre(TestPipes.AtReynolds(re, roughness)))];
            Assert.All(losses.Zip(losses.Skip(1)), p => Assert.True(p.Second > p.First, $"{p.First:R} then {p.Second:R}"));
        }
    }

    [Theory]
    [MemberData(nameof(Ids))]
    public void Still_water_loses_nothing_and_a_trickle_gives_a_number(string id)
    {
        var formula = TestPipes.Formula(id);
        Assert.Equal(0, formula.LossPerMetre(TestPipes.AtReynolds(0, 1e-4)));
        Assert.Null(formula.FactorOf(TestPipes.AtReynolds(0, 1e-4)));
        Assert.Equal(0, formula.EquivalentDarcy(TestPipes.AtReynolds(0, 1e-4)).Value);
        Assert.Empty(formula.UsesBetween(TestPipes.AtReynolds(0, 1e-4), TestPipes.AtReynolds(0, 1e-4)));
        Assert.True(double.IsFinite(formula.LossPerMetre(TestPipes.AtReynolds(1e-300, 1e-4))));
    }

    [Fact]
    public void Formulas_are_found_by_id_or_name_and_Colebrook_White_is_the_default()
    {
        Assert.Equal("colebrook-white", FrictionFormulas.Default.Id);
        Assert.All(FrictionFormulas.All, f =>
        {
            Assert.Same(f, FrictionFormulas.Find(f.Id));
            Assert.Same(f, FrictionFormulas.Find(" " + f.Name.ToUpperInvariant()));
        });
        Assert.Null(FrictionFormulas.Find("fanning"));
        Assert.Null(FrictionFormulas.Find(null));
    }

    [Fact]
    public void Every_friction_formula_of_the_project_stands_in_the_list()
    {
        var types = typeof(FrictionFormula).Assembly.GetTypes().Where(t => !t.IsAbstract && t.IsSubclassOf(typeof(FrictionFormula)));
        Assert.Equal(types.Select(t => t.Name).Order(), FrictionFormulas.All.Select(f => f.GetType().Name).Order());
    }
}
