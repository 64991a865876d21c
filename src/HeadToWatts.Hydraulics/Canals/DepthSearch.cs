namespace HeadToWatts.Hydraulics.Canals;

/// <summary>Finds depths at which a condition is met.</summary>
internal static class DepthSearch
{
    private const double StartM = 1e-6;
    private const double EndM = 1e4;

    /// <summary>
    /// The lowest depth from which a function is no longer below 0; null when it stays below. Steps grow by an eighth, and are
    /// never wider than a 400th of a closed section, so that the lower of two roots is not stepped over.
    /// </summary>
    public static double? Lowest(CanalSection section, Func<double, double> function)
    {
        var endM = Math.Min(section.FullDepthM, EndM);
        double lowM = 0, highM = Math.Min(StartM, endM / 2);
        while (true)
        {
            if (function(highM) >= 0)
                return Between(lowM, highM, function);
            if (highM >= endM)
                return null;
            lowM = highM;
            highM = Math.Min(endM, double.IsInfinity(section.FullDepthM) ? highM * 1.125 : Math.Min(highM * 1.125, highM + (endM / 400)));
        }
    }

    /// <summary>The depth at which a function passes 0 between one where it is below and one where it is not, halved to the last digit.</summary>
    public static double Between(double belowM, double aboveM, Func<double, double> function)
    {
        while (true)
        {
            var middleM = belowM + ((aboveM - belowM) / 2);
            if (middleM == belowM || middleM == aboveM)
                return Math.Abs(Safe(function, belowM)) < Math.Abs(function(aboveM)) ? belowM : aboveM;
            if (function(middleM) >= 0)
                aboveM = middleM;
            else
                belowM = middleM;
        }
    }

    // A function may have no value in a dry section.
    private static double Safe(Func<double, double> function, double depthM) => depthM > 0 ? function(depthM) : double.PositiveInfinity;

    public static void RequireFlow(double flowM3PerS)
    {
        if (!(flowM3PerS > 0 && double.IsFinite(flowM3PerS)))
            throw new ArgumentOutOfRangeException(nameof(flowM3PerS), flowM3PerS, "The flow is above 0.");
    }

    public static void RequirePositive(double figure, string name)
    {
        if (!(figure > 0 && double.IsFinite(figure)))
            throw new ArgumentOutOfRangeException(name, figure, "The figure is above 0.");
    }
}
