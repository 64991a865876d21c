using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords.Devices;

/// <summary>Sources of the devices.</summary>
internal static class DeviceSources
{
    public static readonly Source WaterMeasurementManual = new(
        "usbr-water-measurement", SourceKind.Published, "US Bureau of Reclamation", "2001", "Water Measurement Manual, third edition, revised", "US Department of the Interior");

    public static readonly Source Rehbock = new(
        "rehbock-1929", SourceKind.Published, "Rehbock, T.", "1929", "Discussion of precise weir measurements", "Transactions of the ASCE 93, 1143-1162");

    public static readonly Source Francis = new(
        "francis-1855", SourceKind.Published, "Francis, J. B.", "1855", "Lowell Hydraulic Experiments", "Little, Brown and Company, Boston");

    public static readonly Source Shen = new(
        "shen-1981", SourceKind.Published, "Shen, J.", "1981", "Discharge characteristics of triangular-notch thin-plate weirs", "US Geological Survey Water-Supply Paper 1617-B");

    public static readonly Source Bos = new(
        "bos-1989", SourceKind.Published, "Bos, M. G. (ed.)", "1989", "Discharge Measurement Structures", "ILRI Publication 20, Wageningen");

    public static readonly Source Parshall = new(
        "parshall-1926", SourceKind.Published, "Parshall, R. L.", "1926", "The improved Venturi flume", "Transactions of the ASCE 89, 841-880");

    public static readonly Source LargeFlumes = Source.Memory(
        "parshall-1953-memory", "Parshall flumes of large size, throat 10 to 50 feet (Parshall 1953, Colorado A and M College Bulletin 426-A)");
}
