namespace HeadToWatts.Studies.Worth;

/// <summary>One thing changed by itself, down and up, and what becomes of the net present value.</summary>
/// <param name="Id">Key: lower-case words with hyphens.</param>
/// <param name="Name">What is changed.</param>
/// <param name="WorseText">The change that costs, in words.</param>
/// <param name="BetterText">The change that helps, in words.</param>
/// <param name="WorseAmount">Net present value after it.</param>
/// <param name="BetterAmount">Net present value after the other.</param>
/// <param name="HowToSettle">What would make this surer.</param>
public sealed record SensitivityBar(string Id, string Name, string WorseText, string BetterText, double WorseAmount, double BetterAmount, string HowToSettle)
{
    /// <summary>How far the two lie apart.</summary>
    public double SwingAmount => BetterAmount - WorseAmount;

    /// <summary>True when one end gains and the other loses: this alone decides.</summary>
    public bool Decides => WorseAmount < 0 && BetterAmount >= 0;
}
