namespace HeadToWatts.Turbines;

/// <summary>Speed of a generator that turns in step with the grid.</summary>
public static class SynchronousSpeed
{
    /// <summary>Fewest poles of the generators usually coupled to a water turbine.</summary>
    public const int FewestUsualPoles = 4;

    /// <summary>Most poles of generators that can be bought without being built to order.</summary>
    public const int MostUsualPoles = 48;

    /// <summary>n = 120 f / p in rpm.</summary>
    /// <param name="poles">Number of poles, even, at least 2.</param>
    /// <param name="frequencyHz">Frequency of the grid, Hz.</param>
    /// <exception cref="ArgumentOutOfRangeException">An odd number of poles, fewer than 2, or a frequency that is not positive.</exception>
    public static double Rpm(int poles, double frequencyHz)
    {
        if (poles < 2 || poles % 2 != 0)
            throw new ArgumentOutOfRangeException(nameof(poles), poles, "A generator has an even number of poles.");
        if (!(frequencyHz > 0) || double.IsInfinity(frequencyHz))
            throw new ArgumentOutOfRangeException(nameof(frequencyHz), frequencyHz, "A frequency is a positive number.");
        return 120 * frequencyHz / poles;
    }
}
