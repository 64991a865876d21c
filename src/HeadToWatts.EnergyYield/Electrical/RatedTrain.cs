namespace HeadToWatts.EnergyYield.Electrical;

/// <summary>The machines behind the shaft with their figures settled for a plant.</summary>
/// <param name="Generator">One of the generators; null where a constant efficiency stands for them.</param>
/// <param name="Transformer">The transformer; null where a constant efficiency stands for it.</param>
/// <param name="UnitCount">Number of generators.</param>
public sealed record RatedTrain(RatedGenerator? Generator, RatedTransformer? Transformer, int UnitCount)
{
    /// <summary>Rated output of all generators, kW; zero where a constant efficiency stands for them.</summary>
    public double GeneratorsKw => (Generator?.RatedPowerKw ?? 0) * UnitCount;

    /// <summary>Losses of all generators at rated output, kW.</summary>
    public double GeneratorsLossKw => (Generator?.FullLoadLossKw ?? 0) * UnitCount;
}

/// <summary>Power after each step from the shaft to the meter, kW, while the plant runs.</summary>
/// <param name="DrivenKw">At the generators' shafts.</param>
/// <param name="GeneratedKw">At the generators' terminals.</param>
/// <param name="SentKw">After own use.</param>
/// <param name="TransformedKw">After the transformer.</param>
/// <param name="MeterKw">At the meter.</param>
public readonly record struct TrainPower(double DrivenKw, double GeneratedKw, double SentKw, double TransformedKw, double MeterKw);

/// <summary>A year's means after each step from the shaft to the meter, kW, where the machines are given in detail.</summary>
/// <param name="DrivenKw">At the generators' shafts.</param>
/// <param name="GeneratedKw">At the generators' terminals.</param>
/// <param name="SentKw">After own use.</param>
/// <param name="TransformedKw">After the transformer.</param>
/// <param name="DeliveredKw">At the meter while the plant runs.</param>
/// <param name="StandingKw">Drawn from the grid while the plant stands.</param>
public sealed record TrainMeans(double DrivenKw, double GeneratedKw, double SentKw, double TransformedKw, double DeliveredKw, double StandingKw)
{
    /// <summary>Adds the means of parts of the year; null when no part has any.</summary>
    /// <param name="parts">The parts.</param>
    public static TrainMeans? Sum(IEnumerable<TrainMeans?> parts)
    {
        ArgumentNullException.ThrowIfNull(parts);
        TrainMeans? sum = null;
        foreach (var part in parts)
        {
            if (part is not null)
            {
                sum = sum is null ? part : new TrainMeans(
                    sum.DrivenKw + part.DrivenKw, sum.GeneratedKw + part.GeneratedKw, sum.SentKw + part.SentKw,
                    sum.TransformedKw + part.TransformedKw, sum.DeliveredKw + part.DeliveredKw, sum.StandingKw + part.StandingKw);
            }
        }

        return sum;
    }
}
