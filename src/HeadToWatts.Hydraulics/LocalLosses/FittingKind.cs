using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Hydraulics.LocalLosses;

/// <summary>Where along its pipe a fitting takes its loss.</summary>
public enum FittingPlace
{
    /// <summary>At the start of the element: entrances, racks, contractions.</summary>
    Entrance,

    /// <summary>Somewhere along the element.</summary>
    Along,

    /// <summary>Behind the machine, at the outlet.</summary>
    Exit,
}

/// <summary>A kind of fitting with its usual loss coefficient K in h_L = K V^2/2g, V being the velocity in its pipe.</summary>
/// <param name="Id">Key.</param>
/// <param name="Name">Name in the trade.</param>
/// <param name="LossCoefficient">Usual K.</param>
/// <param name="Lowest">Lowest K found in the sources.</param>
/// <param name="Highest">Highest K found in the sources.</param>
/// <param name="Source">Where K comes from.</param>
/// <param name="Locator">Place in the source, or what the figure holds for.</param>
public sealed record FittingKind(string Id, string Name, double LossCoefficient, double Lowest, double Highest, Source Source, string Locator)
{
    /// <summary>Where along its pipe the fitting takes its loss.</summary>
    public FittingPlace Place { get; init; } = FittingPlace.Along;
}
