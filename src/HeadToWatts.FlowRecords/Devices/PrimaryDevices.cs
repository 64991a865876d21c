using System.Globalization;
using HeadToWatts.Basis.Problems;
using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Devices;

/// <summary>Measures of a device as a study gives them; those a kind does not need stay empty.</summary>
public sealed record DeviceMeasures
{
    /// <summary>Width of the channel, length of the crest across the flow, or width of the throat, m.</summary>
    public double? WidthM { get; init; }

    /// <summary>Height of the crest over the floor upstream, m.</summary>
    public double? CrestHeightM { get; init; }

    /// <summary>Length of a broad crest along the flow, m.</summary>
    public double? CrestBreadthM { get; init; }

    /// <summary>Width of the channel upstream of a broad crest, m; with the crest height it gives the velocity of approach.</summary>
    public double? ApproachWidthM { get; init; }

    /// <summary>Angle of a notch, rad.</summary>
    public double? AngleRad { get; init; }

    /// <summary>How many ends are contracted.</summary>
    public int? Contractions { get; init; }

    /// <summary>Discharge coefficient.</summary>
    public double? DischargeCoefficient { get; init; }
}

/// <summary>A kind of device that may be chosen.</summary>
/// <param name="Id">Key as study files write it.</param>
/// <param name="Name">Name in the trade.</param>
/// <param name="Measures">What must be given, in words.</param>
/// <param name="Methods">Its methods.</param>
public sealed record DeviceKind(string Id, string Name, string Measures, IReadOnlyList<Method> Methods)
{
    private readonly Func<DeviceMeasures, PrimaryDevice?> _make = _ => null;

    internal DeviceKind(string id, string name, string measures, IReadOnlyList<Method> methods, Func<DeviceMeasures, PrimaryDevice?> make)
        : this(id, name, measures, methods) => _make = make;

    /// <summary>Makes the device, or says what is missing or wrong.</summary>
    /// <param name="measures">Its measures.</param>
    /// <param name="where">Field they come from.</param>
    public Checked<PrimaryDevice> Make(DeviceMeasures measures, string where)
    {
        ArgumentNullException.ThrowIfNull(measures);
        try
        {
            return _make(measures) is { } device
                ? Checked.Of(device)
                : Checked.Refused<PrimaryDevice>(new Problem(where, Name, "a measure is missing", Measures));
        }
        catch (ArgumentOutOfRangeException refused)
        {
            return Checked.Refused<PrimaryDevice>(new Problem(where, Convert.ToString(refused.ActualValue, CultureInfo.InvariantCulture) ?? "", refused.Message.Split('(')[0].Split('\n')[0].Trim(), Measures));
        }
    }
}

/// <summary>The devices that may be chosen.</summary>
public static class PrimaryDevices
{
    /// <summary>All of them.</summary>
    public static IReadOnlyList<DeviceKind> All { get; } =
    [
        new("suppressed-weir", "Rectangular weir over the whole width", "width and crest height", [SuppressedRectangularWeir.Rehbock],
            m => m is { WidthM: { } b, CrestHeightM: { } p } ? new SuppressedRectangularWeir(b, p) : null),
        new("contracted-weir", "Rectangular weir with end contractions", "crest length; number of end contractions (2 when not given)", [ContractedRectangularWeir.Francis],
            m => m is { WidthM: { } l } ? new ContractedRectangularWeir(l, m.Contractions ?? 2) : null),
        new("cipolletti-weir", "Cipolletti weir", "crest length", [CipollettiWeir.Cipolletti],
            m => m is { WidthM: { } l } ? new CipollettiWeir(l) : null),
        new("v-notch-weir", "V-notch weir", "angle (90 degrees when not given); discharge coefficient (0.585 when not given)", [VNotchWeir.VNotch],
            m => new VNotchWeir(m.AngleRad ?? Math.PI / 2, m.DischargeCoefficient ?? VNotchWeir.UsualDischargeCoefficient)),
        new("broad-crested-weir", "Broad-crested weir", "crest length across and along the flow, discharge coefficient; width of the channel upstream and crest height for the velocity of approach", [BroadCrestedWeir.BroadCrest],
            m => m is { WidthM: { } l, CrestBreadthM: { } b, DischargeCoefficient: { } c }
                ? new BroadCrestedWeir(l, b, c, m is { ApproachWidthM: { } w, CrestHeightM: { } p } ? new ApproachChannel(w, p) : null)
                : null),
        new("parshall-flume", "Parshall flume", "throat width, 1 to 8 ft or 10 to 50 ft", [ParshallFlume.Medium, ParshallFlume.Large],
            m => m is { WidthM: { } w } ? new ParshallFlume(w) : null),
    ];

    /// <summary>Finds a kind by its key; null when there is none.</summary>
    /// <param name="id">Key.</param>
    public static DeviceKind? Find(string id) => All.FirstOrDefault(k => string.Equals(k.Id, id, StringComparison.OrdinalIgnoreCase));
}
