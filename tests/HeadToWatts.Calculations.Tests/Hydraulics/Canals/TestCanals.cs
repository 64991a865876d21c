using CsCheck;
using HeadToWatts.Hydraulics.Canals;
using HeadToWatts.Hydraulics.Canals.Sections;

namespace HeadToWatts.Calculations.Tests.Hydraulics.Canals;

internal static class TestCanals
{
    public const double GravityMPerS2 = 9.80665;

    public static readonly NaturalSection Surveyed = NaturalSection.FromPoints(
        [new(0, 103), new(1.5, 101.2), new(3, 100.4), new(4.2, 100), new(5, 100.3), new(7.5, 101.6), new(9, 103.2)], "section").Value;

    public static readonly Gen<CanalSection> Open = Gen.OneOf(
        Gen.Double[0.3, 20].Select(b => (CanalSection)new RectangularSection(b)),
        Gen.Select(Gen.Double[0, 20], Gen.Double[0.25, 4]).Select((b, m) => (CanalSection)new TrapezoidalSection(b, m)));

    public static readonly Gen<CanalSection> Any = Gen.OneOf(
        Open,
        Gen.Double[0.2, 4].Select(d => (CanalSection)new CircularSection(d)),
        Gen.Const((CanalSection)Surveyed));

    /// <summary>The section of a row: its shape, its width or diameter, its side slope.</summary>
    public static CanalSection Section(CheckRow row) => row.Text("shape") switch
    {
        "rectangular" => new RectangularSection(row["sizeM"]),
        "trapezoidal" => new TrapezoidalSection(row["sizeM"], row["sideSlopeRatio"]),
        "circular" => new CircularSection(row["sizeM"]),
        var other => throw new InvalidOperationException(other),
    };
}
