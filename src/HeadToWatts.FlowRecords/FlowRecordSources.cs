using HeadToWatts.Basis.Sources;

namespace HeadToWatts.FlowRecords;

/// <summary>Sources of the flow methods.</summary>
internal static class FlowRecordSources
{
    public static readonly Source Stedinger = new("stedinger-1993", SourceKind.Published, "Stedinger, J. R., Vogel, R. M., Foufoula-Georgiou, E.", "1993", "Frequency analysis of extreme events", "Handbook of Hydrology (D. R. Maidment, ed.), chapter 18, McGraw-Hill");

    public static readonly Source Vogel = new("vogel-fennessey-1994", SourceKind.Published, "Vogel, R. M., Fennessey, N. M.", "1994", "Flow-duration curves I: new interpretation and confidence intervals", "Journal of Water Resources Planning and Management 120(4)");

    public static readonly Source Searcy = new("searcy-1959", SourceKind.Published, "Searcy, J. K.", "1959", "Flow-duration curves", "Manual of Hydrology part 2, US Geological Survey Water-Supply Paper 1542-A");

    public static readonly Source Bulletin17B = new("bulletin-17b", SourceKind.Published, "Interagency Advisory Committee on Water Data", "1982", "Guidelines for determining flood flow frequency", "Bulletin 17B of the Hydrology Subcommittee, US Geological Survey");

    public static readonly Source Riggs = new("riggs-1972", SourceKind.Published, "Riggs, H. C.", "1972", "Low-flow investigations", "US Geological Survey Techniques of Water-Resources Investigations, book 4, chapter B1");

    public static readonly Source Hirsch = new("hirsch-1982", SourceKind.Published, "Hirsch, R. M.", "1982", "A comparison of four streamflow record extension techniques", "Water Resources Research 18(4), 1081-1088");

    public static readonly Source Hortness = new("hortness-2006", SourceKind.Published, "Hortness, J. E.", "2006", "Estimating low-flow frequency statistics for unregulated streams in Idaho", "US Geological Survey Scientific Investigations Report 2006-5035 and its supplement 2008-5126");

    public static readonly Source Tennant = new("tennant-1976", SourceKind.Published, "Tennant, D. L.", "1976", "Instream flow regimens for fish, wildlife, recreation and related environmental resources", "Fisheries 1(4), 6-10");

    public static readonly Source Iso748 = new("iso-748", SourceKind.Standard, "International Organization for Standardization", "2007", "Hydrometry: measurement of liquid flow in open channels using current-meters or floats", "ISO 748");
}
