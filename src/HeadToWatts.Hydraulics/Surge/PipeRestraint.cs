namespace HeadToWatts.Hydraulics.Surge;

/// <summary>How the pipe is held lengthwise, which decides the factor c_1 of the wave speed.</summary>
public enum PipeRestraint
{
    /// <summary>Expansion joints throughout: c_1 = 1.</summary>
    ExpansionJoints,

    /// <summary>Anchored at the upstream end only: c_1 = 1 - ν/2.</summary>
    AnchoredUpstream,

    /// <summary>Anchored throughout against lengthwise movement: c_1 = 1 - ν^2. It gives the fastest wave in most pipe and is the default.</summary>
    AnchoredThroughout,
}
