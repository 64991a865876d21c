namespace HeadToWatts.Studies.Cautions;

/// <summary>How much a caution weighs.</summary>
public enum Severity
{
    /// <summary>The result cannot be relied on until this is settled.</summary>
    SettleFirst,

    /// <summary>Weigh it before going on.</summary>
    Weigh,

    /// <summary>Good to know.</summary>
    Note,
}
