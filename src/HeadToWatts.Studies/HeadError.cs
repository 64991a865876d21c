using HeadToWatts.Basis.Quantities;
using HeadToWatts.EnergyYield;
using HeadToWatts.Hydraulics.Levels;
using HeadToWatts.Studies.Inputs;
using HeadToWatts.Studies.Results;

namespace HeadToWatts.Studies;

/// <summary>Carries the error of the measured head through to the energy.</summary>
internal static class HeadError
{
    internal static EnergyRange? Range(AlternativeInput input, PlantDesign design, FlowSupply supply)
    {
        var error = input.Head.ErrorM;
        if (error <= 0)
            return null;
        return new EnergyRange(EnergyKwh(input, design, supply, -error), EnergyKwh(input, design, supply, error));
    }

    /// <summary>Energy of a mean year with the gross head higher or lower by a shift, kWh.</summary>
    internal static double EnergyKwh(AlternativeInput input, PlantDesign design, FlowSupply supply, double shiftM)
    {
        var gross = Math.Max(input.Head.Gross.Metres + shiftM, 1e-3);
        var shifted = input with
        {
            Head = input.Head with
            {
                Gross = GrossHead.FromMetres(gross),
                HeadwaterRule = input.Head.Moves ? new ShiftedLevel(input.Head.Headwater, shiftM) : null,
            },
        };
        return AnnualEnergy.Of(YearOfParts.Make(shifted, design with { GrossHead = shifted.Head.Gross }, supply).Parts).AnnualEnergyKwh;
    }
}
