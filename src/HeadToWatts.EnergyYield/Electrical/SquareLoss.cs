namespace HeadToWatts.EnergyYield.Electrical;

/// <summary>A loss of a constant part and a part that grows with the square of the output: P_in = P + c + a P^2.</summary>
internal static class SquareLoss
{
    /// <summary>The output that goes with an input, kW. Below the constant part the output is negative: power is drawn.</summary>
    /// <param name="inputKw">Input, kW.</param>
    /// <param name="constantKw">Constant loss c, kW; 0 or more.</param>
    /// <param name="perKw">a, 1/kW; 0 or more.</param>
    internal static double OutputKw(double inputKw, double constantKw, double perKw)
    {
        var left = inputKw - constantKw;

        // The rationalised root loses no digits when the loss is small. Where a wire could not carry the draw at all, the draw itself is returned.
        return 2 * left / (1 + Math.Sqrt(Math.Max(0, 1 + (4 * perKw * left))));
    }
}
