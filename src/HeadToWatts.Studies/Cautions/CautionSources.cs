using HeadToWatts.Basis.Sources;
using HeadToWatts.Hydraulics.Waterways;

namespace HeadToWatts.Studies.Cautions;

/// <summary>The authorities behind the cautions.</summary>
internal static class CautionSources
{
    internal static readonly Source Reclamation2012 = new("usbr-2012-conduits", SourceKind.Published, "US Bureau of Reclamation", "2012", "Site inventory and hydropower energy assessment of Reclamation owned conduits", "supplement to the 2011 resource assessment; screening limits of 5 ft, 4 months and 50 kW");

    internal static readonly Source Corps1979 = new("usace-tp-61", SourceKind.Published, "US Army Corps of Engineers, Hydrologic Engineering Center", "1979", "Feasibility studies for small scale hydropower additions", "Technical Paper 61");

    internal static readonly Source Usbr = VelocityLimits.Method.Source;

    internal static readonly Source Esha = new("esha-2004", SourceKind.Published, "European Small Hydropower Association", "2004", "Guide on how to develop a small hydropower plant", "Brussels");

    internal static readonly Source Practice = Source.CommonPractice("practice-screening", "Screening practice in small hydropower");

    internal static readonly Source MethodRange = new("stated-range", SourceKind.Decision, "This project", "", "A method used outside the range its source states is reported", "decision 0003");

    internal static readonly Source Transition = Source.Decision("0004", "Friction between laminar and turbulent flow");

    internal static readonly Source DesignFlow = Source.Decision("0006", "Suggesting a design flow");

    internal static readonly Source Choice = Source.Decision("0005", "Ranking turbine types");

    internal static readonly Source Dispatch = Source.Decision("0007", "Bringing units in");
}
