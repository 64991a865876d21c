using HeadToWatts.Basis.Units;
using HeadToWatts.Studies.Results;
using HeadToWatts.Turbines.Sizing;

namespace HeadToWatts.Studies;

/// <summary>Says size and setting of a machine in words and numbers.</summary>
public static class MachineWords
{
    /// <summary>Diameter of the runner; null where it is not known.</summary>
    /// <param name="sheet">The machine.</param>
    /// <param name="show">Units in which numbers are shown.</param>
    public static string? Diameter(MachineSheet sheet, UnitDisplay show)
    {
        ArgumentNullException.ThrowIfNull(sheet);
        ArgumentNullException.ThrowIfNull(show);
        return (sheet.Geometry?.DiameterM ?? sheet.Candidate.Speed?.RunnerDiameterM) is { } diameterM ? show.Diameter(diameterM) : null;
    }

    /// <summary>Size of the runner and what belongs to it, in one line; empty where it is not known.</summary>
    /// <param name="sheet">The machine.</param>
    /// <param name="show">Units in which numbers are shown.</param>
    public static string Size(MachineSheet sheet, UnitDisplay show)
    {
        ArgumentNullException.ThrowIfNull(sheet);
        ArgumentNullException.ThrowIfNull(show);
        if (sheet.Geometry is not { } geometry)
            return Diameter(sheet, show) is { } wheel ? wheel + " across" : "";
        return string.Join("; ", geometry.Others.Select(o => $"{o.Name} {Length(o.LengthM)}").Prepend($"{geometry.DiameterName} {show.Diameter(geometry.DiameterM)}").Concat(geometry.Parts));

        string Length(double lengthM) => lengthM < 2 ? show.Diameter(lengthM) : show.Length(lengthM);
    }

    /// <summary>The highest setting, or why there is none.</summary>
    /// <param name="sheet">The machine.</param>
    /// <param name="show">Units in which numbers are shown.</param>
    public static string Setting(MachineSheet sheet, UnitDisplay show)
    {
        ArgumentNullException.ThrowIfNull(sheet);
        ArgumentNullException.ThrowIfNull(show);
        if (sheet.Setting is { } setting)
            return (setting.HighestM < 0 ? "−" : "+") + show.Length(Math.Abs(setting.HighestM));
        return sheet.Candidate.Type.Id == "pump-as-turbine" ? "ask the maker" : "in the air";
    }

    /// <summary>What the setting means, in sentences.</summary>
    /// <param name="sheet">The machine.</param>
    /// <param name="show">Units in which numbers are shown.</param>
    public static string SettingSentence(MachineSheet sheet, UnitDisplay show)
    {
        ArgumentNullException.ThrowIfNull(sheet);
        ArgumentNullException.ThrowIfNull(show);
        return sheet.Setting is { } s
            ? $"With Thoma's coefficient {UnitDisplay.Number(s.ThomaSigma)}, air at {show.Length(s.AirHeadM)} and vapour at {show.Length(s.VapourHeadM)} of water, the runner stands at most {show.Length(Math.Abs(s.HighestM))} {(s.HighestM < 0 ? "below" : "above")} the lowest tailwater{(s.HighestM < 0 ? ", or deeper" : "")}; the mouth of the draft tube is usually kept {show.Length(RunnerSetting.DraftTubeCoverM)} under it."
            : sheet.Candidate.Type.Id == "pump-as-turbine"
                ? "How high a pump may stand as a turbine is for its maker to say."
                : "The runner turns in air above the highest tailwater; the height between is head not used.";
    }
}
