namespace HeadToWatts.EnergyYield.Electrical;

/// <summary>A transformer as it is chosen; one for the plant.</summary>
/// <param name="RatingKva">Rating, kVA; null to size it to the generators.</param>
/// <param name="NoLoadLoss">What it draws whenever it is live.</param>
/// <param name="LoadLoss">What it loses at its rating beyond that.</param>
/// <param name="StaysLive">True when it is fed from the grid while the plant stands.</param>
public sealed record TransformerMachine(double? RatingKva, RatedLoss NoLoadLoss, RatedLoss LoadLoss, bool StaysLive)
{
    /// <summary>The transformer sized for the plant.</summary>
    /// <param name="apparentKva">Apparent power of the generators at rated output, kVA.</param>
    internal RatedTransformer Rate(double apparentKva)
    {
        var rating = RatingKva ?? Math.Max(apparentKva, 1e-6);
        return new RatedTransformer(rating, NoLoadLoss.Kw(rating), LoadLoss.Kw(rating));
    }
}

/// <summary>A loss given in kW, or as a share of a rating.</summary>
/// <param name="LossKw">Loss, kW; null when it is a share.</param>
/// <param name="RatingShare">Loss over the rating in kVA, 0 to 1; not used where kW are given.</param>
public readonly record struct RatedLoss(double? LossKw, double RatingShare)
{
    /// <summary>The loss, kW.</summary>
    /// <param name="ratingKva">Rating, kVA.</param>
    public double Kw(double ratingKva) => LossKw ?? (RatingShare * ratingKva);
}

/// <summary>A transformer with its figures settled.</summary>
/// <param name="RatingKva">Rating, kVA.</param>
/// <param name="NoLoadLossKw">P_0, kW.</param>
/// <param name="LoadLossKw">P_k at the rating, kW.</param>
public readonly record struct RatedTransformer(double RatingKva, double NoLoadLossKw, double LoadLossKw)
{
    /// <summary>Efficiency at an output, 0 to 1.</summary>
    /// <param name="outputKw">Power put out, kW, above 0.</param>
    /// <param name="powerFactor">Power factor, 0 to 1.</param>
    public double EfficiencyAt(double outputKw, double powerFactor)
    {
        var load = outputKw / (powerFactor * RatingKva);
        return outputKw / (outputKw + NoLoadLossKw + (LoadLossKw * load * load));
    }
}
