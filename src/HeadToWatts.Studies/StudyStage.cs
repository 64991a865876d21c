namespace HeadToWatts.Studies;

/// <summary>The stages of a study, in the order in which water becomes a memo.</summary>
public enum StudyStage
{
    /// <summary>Flow.</summary>
    Flow,

    /// <summary>Head.</summary>
    Head,

    /// <summary>Waterway.</summary>
    Waterway,

    /// <summary>Turbine.</summary>
    Turbine,

    /// <summary>Energy.</summary>
    Energy,

    /// <summary>Pumping.</summary>
    Pumping,

    /// <summary>Money.</summary>
    Money,
}
