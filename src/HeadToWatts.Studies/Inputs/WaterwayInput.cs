using HeadToWatts.Hydraulics.Friction;
using HeadToWatts.Hydraulics.Waterways;

namespace HeadToWatts.Studies.Inputs;

/// <summary>The waterway from the headwater to the machine.</summary>
/// <param name="Elements">Pipe elements in order; none when the machine stands at the drop.</param>
/// <param name="Formula">Friction formula.</param>
/// <param name="KineticEnergyCoefficient">alpha, 1.0 to 1.3.</param>
public sealed record WaterwayInput(IReadOnlyList<PipeElement> Elements, FrictionFormula Formula, double KineticEnergyCoefficient)
{
    /// <summary>How the plant stops; null when no transient is to be run.</summary>
    public StopInput? Stop { get; init; }

    /// <summary>The waterway, ready to be reckoned with.</summary>
    public Waterway Build() => new(Elements, Formula, KineticEnergyCoefficient);
}
