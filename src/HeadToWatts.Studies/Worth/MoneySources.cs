using HeadToWatts.Basis.Sources;

namespace HeadToWatts.Studies.Worth;

/// <summary>The authorities behind what is said about money.</summary>
public static class MoneySources
{
    /// <summary>The plain answer and its thresholds.</summary>
    public static Source PlainAnswer { get; } = Source.Decision("0021", "The plain answer and its thresholds");

    /// <summary>How far each thing is swung.</summary>
    public static Source Swings { get; } = Source.Decision("0022", "How far each thing is swung by itself");

    /// <summary>Practice of estimates.</summary>
    public static Source Practice { get; } = Source.CommonPractice("practice-estimates", "Practice of cost estimates and economic comparison before a feasibility study");
}
