using HeadToWatts.Hydraulics.LocalLosses;

namespace HeadToWatts.Calculations.Tests.Hydraulics.LocalLosses;

public class LocalLossTests
{
    private const double Foot = 0.3048;

    [Fact]
    public void A_loss_is_K_times_the_velocity_head()
    {
        foreach (var row in CheckRows.With(LocalLoss.Method.Id, "lossCoefficient"))
        {
            var velocityMPerS = Math.Sqrt(2 * 9.81 * row["velocityHeadFt"] * Foot);
            row.Check(LocalLoss.LossM(row["lossCoefficient"], velocityMPerS, 9.81) / Foot, "expectedFt");
        }
    }

    [Fact]
    public void Velocity_heads_equal_the_penstock_tabulation()
    {
        foreach (var row in CheckRows.With(LocalLoss.Method.Id, "flowCfs"))
        {
            var diameterM = row["diameterIn"] * 0.0254;
            var velocityMPerS = row["flowCfs"] * Foot * Foot * Foot / (Math.PI / 4 * diameterM * diameterM);
            row.Check(LocalLoss.LossM(1, velocityMPerS, 9.80665) / Foot, "expectedFt");
        }
    }

    [Fact]
    public void Penstock_bends_equal_the_penstock_tabulation()
    {
        foreach (var row in CheckRows.With(PenstockBend.Method.Id, "deflectionDeg"))
            row.Check(PenstockBend.LossCoefficient(CheckRows.Rad(row["deflectionDeg"])) * row["share"] * row["velocityHeadFt"], "expectedFt");
    }

    [Fact]
    public void Sudden_contractions_equal_the_formula_and_agree_with_measured_ones()
    {
        foreach (var row in CheckRows.With(SuddenContraction.Method.Id, "areaRatio"))
            row.Check(SuddenContraction.LossCoefficient(row["areaRatio"]));
    }

    [Fact]
    public void Sudden_expansions_equal_Borda_and_Carnot()
    {
        foreach (var row in CheckRows.With(SuddenExpansion.Method.Id, "areaRatio"))
            row.Check(SuddenExpansion.LossCoefficient(row["areaRatio"]));
    }

    [Fact]
    public void Trash_racks_equal_Kirschmer()
    {
        foreach (var row in CheckRows.With(TrashRack.Method.Id, "barShapeCoefficient"))
        {
            row.Check(TrashRack.LossM(
                row["barShapeCoefficient"], row["barThicknessMm"] / 1000, row["clearSpacingMm"] / 1000, CheckRows.Rad(row["inclinationDeg"]), row["approachVelocityMPerS"], 9.81));
        }
    }

    [Theory]
    [InlineData(-0.1)]
    [InlineData(1.1)]
    [InlineData(double.NaN)]
    public void Impossible_area_ratios_and_angles_are_refused(double figure)
    {
        Assert.Throws<ArgumentOutOfRangeException>(() => SuddenContraction.LossCoefficient(figure));
        Assert.Throws<ArgumentOutOfRangeException>(() => SuddenExpansion.LossCoefficient(figure));
        Assert.Throws<ArgumentOutOfRangeException>(() => PenstockBend.LossCoefficient(figure * 2));
        Assert.Throws<ArgumentOutOfRangeException>(() => TrashRack.LossM(2.42, 0.01, 0.05, figure * 2, 1, 9.81));
    }
}
