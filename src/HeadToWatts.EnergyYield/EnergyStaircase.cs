using HeadToWatts.EnergyYield.Electrical;

namespace HeadToWatts.EnergyYield;

/// <summary>One step down from the energy of the falling water to the energy at the meter.</summary>
/// <param name="Name">What is lost in the step.</param>
/// <param name="LossKwh">Energy lost, kWh a year.</param>
/// <param name="LeftKwh">Energy left after the step, kWh a year.</param>
public sealed record EnergyStep(string Name, double LossKwh, double LeftKwh);

/// <summary>The year's energy from the water in the turbines to the meter, step by step; the steps add up.</summary>
/// <param name="GrossKwh">gamma V H_gross of the water that goes through the turbines while fit to run, kWh a year.</param>
/// <param name="Steps">The steps in order.</param>
public sealed record EnergyStaircase(double GrossKwh, IReadOnlyList<EnergyStep> Steps)
{
    /// <summary>Lays out the steps of a year.</summary>
    /// <param name="year">Means of the year.</param>
    /// <param name="train">From the shaft to the meter.</param>
    /// <param name="hours">Hours in the year, h.</param>
    public static EnergyStaircase Of(YearIntegral year, PowerTrain train, double hours)
    {
        ArgumentNullException.ThrowIfNull(year);
        ArgumentNullException.ThrowIfNull(train);
        var steps = new List<EnergyStep>();
        var left = year.GrossPowerKw * hours;
        Down("waterway", year.HydraulicPowerKw * hours);
        Down("turbine", year.ShaftPowerKw * hours);
        if (year.Train is { } trainMeans)
            Detailed(trainMeans);
        else
            Constant();
        Down("out of service", left * train.Availability);
        return new EnergyStaircase(year.GrossPowerKw * hours, steps);

        // Machines whose losses move with the load: the integral has the mean after each step.
        void Detailed(TrainMeans means)
        {
            Down("gear or belt", means.DrivenKw * hours);
            Down("generator", means.GeneratedKw * hours);
            Down("own use", means.SentKw * hours);
            Down("transformer", means.TransformedKw * hours);
            Down("line", means.DeliveredKw * hours);
            if (means.StandingKw > 0)
                Down("transformer while standing", (means.DeliveredKw - means.StandingKw) * hours);
        }

        void Constant()
        {
            Down("gear or belt", left * train.DriveEfficiency);
            Down("generator", left * train.GeneratorEfficiency);
            // The plant stops itself before its own use exceeds its output, so the meter's energy fixes this step.
            var behind = train.TransformerEfficiency * train.LineEfficiency;
            Down("own use", behind > 0 ? year.MeterPowerKw * hours / behind : 0);
            Down("transformer", left * train.TransformerEfficiency);
            Down("line", left * train.LineEfficiency);
        }

        void Down(string name, double to)
        {
            steps.Add(new EnergyStep(name, left - to, to));
            left = to;
        }
    }
}
