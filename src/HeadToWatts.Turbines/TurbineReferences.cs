using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Turbines;

/// <summary>The sources that stand behind more than one turbine type or method.</summary>
public static class TurbineReferences
{
    /// <summary>P. K. Nag, Power Plant Engineering: specific speed in kW and m, similarity, Pelton wheels.</summary>
    public static Source Nag { get; } = new("nag-power-plant", SourceKind.Published, "P. K. Nag", "", "Power Plant Engineering", "McGraw-Hill, chapter 10");

    /// <summary>Daugherty and Franzini, Fluid Mechanics with Engineering Applications: specific speed in hp and ft.</summary>
    public static Source DaughertyFranzini { get; } = new("daugherty-franzini", SourceKind.Published, "R. L. Daugherty and J. B. Franzini", "", "Fluid Mechanics with Engineering Applications", "McGraw-Hill");

    /// <summary>Dixon: power specific speed.</summary>
    public static Source Dixon { get; } = new("dixon-turbomachinery", SourceKind.Published, "S. L. Dixon", "", "Fluid Mechanics and Thermodynamics of Turbomachinery", "Butterworth-Heinemann");

    /// <summary>IEC 60193: the dimensionless specific speed n_QE.</summary>
    public static Source Iec60193 { get; } = new("iec-60193", SourceKind.Standard, "International Electrotechnical Commission", "", "Hydraulic turbines, storage pumps and pump-turbines: model acceptance tests", "IEC 60193");

    /// <summary>Conversion of units, which needs no source but algebra.</summary>
    public static Source UnitAlgebra { get; } = Source.CommonPractice("specific-speed-algebra", "Specific speed restated in other units");

    /// <summary>n = 120 f / p.</summary>
    public static Source SynchronousMachines { get; } = Source.CommonPractice("synchronous-machines", "Speed of a synchronous machine from poles and frequency");

    /// <summary>A note on turbine types with their usual head ranges; its values are those of the usual small-hydro table.</summary>
    public static Source HeadRanges { get; } = new("turbine-head-ranges", SourceKind.Published, "", "", "Types of turbine (note with the usual head range of each type)", "Scribd document 624851128; a secondary source, advisory");

    /// <summary>A note on runaway speeds.</summary>
    public static Source RunawaySpeeds { get; } = new("runaway-speeds", SourceKind.Published, "", "", "Run away speed (note with the ratios of each type)", "Scribd document 423881188; a secondary source");

    /// <summary>Britannica's article on turbines: selection on specific speed.</summary>
    public static Source Britannica { get; } = new("britannica-turbine", SourceKind.Published, "Encyclopaedia Britannica", "", "Turbine: selection on the basis of specific speed", "");

    /// <summary>
    /// A table of metric specific speeds. It prints them as "speed, rpm"; they are specific speeds in metric horsepower and metres, and
    /// are used here as that.
    /// </summary>
    public static Source SpecificSpeedRanges { get; } = new("specific-speed-ranges", SourceKind.Published, "", "", "Turbine table with metric specific speeds", "electricalengineering.xyz; printed as rpm, read as rpm, metric hp, m");

    /// <summary>Hong Kong government, turbine types: heads of Francis and propeller turbines.</summary>
    public static Source HongKongTurbines { get; } = new("hong-kong-turbine-types", SourceKind.Published, "Electrical and Mechanical Services Department, Hong Kong", "", "Hydroelectric: turbine types", "re.emsd.gov.hk");

    /// <summary>Typical envelopes of small turbines.</summary>
    public static Source TypicalEnvelopes { get; } = Source.Memory("typical-envelopes", "Usual heads and flows of small turbines, as drawn on makers' selection charts");

    /// <summary>Typical part-load efficiency of small turbines.</summary>
    public static Source TypicalEfficiency { get; } = Source.Memory("typical-efficiency", "Usual efficiency of small turbines against the ratio of flow to full flow");

    /// <summary>Typical least flows.</summary>
    public static Source TypicalLeastFlow { get; } = Source.Memory("typical-least-flow", "Least flow of small turbines against full flow, after the European guide on small hydropower (ESHA 2004)");

    /// <summary>Typical specific speeds.</summary>
    public static Source TypicalSpecificSpeed { get; } = Source.Memory("typical-specific-speed", "Usual specific speeds of turbine types in the small-hydro literature");

    /// <summary>Typical runaway ratios.</summary>
    public static Source TypicalRunaway { get; } = Source.Memory("typical-runaway", "Usual runaway ratios, after the European guide on small hydropower (ESHA 2004) and textbooks");

    /// <summary>Uses and limits.</summary>
    public static Source TypicalUses { get; } = Source.CommonPractice("turbine-uses", "Usual uses and limits of turbine types");
}
