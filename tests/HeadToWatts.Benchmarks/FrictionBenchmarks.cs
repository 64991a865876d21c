using BenchmarkDotNet.Attributes;
using HeadToWatts.Hydraulics.Friction;

namespace HeadToWatts.Benchmarks;

/// <summary>One friction loss per metre by each formula, at a flow that changes so that nothing can be foreseen.</summary>
[MemoryDiagnoser]
public class FrictionBenchmarks
{
    private readonly FrictionFormula[] _formulas = [.. FrictionFormulas.All];
    private int _i;

    [ParamsSource(nameof(Ids))]
    public string Formula { get; set; } = "";

    public static IEnumerable<string> Ids => FrictionFormulas.All.Select(f => f.Id);

    private FrictionFormula _formula = FrictionFormulas.Default;

    [GlobalSetup]
    public void Setup() => _formula = Array.Find(_formulas, f => f.Id == Formula)!;

    [Benchmark]
    public double LossPerMetre()
    {
        _i = (_i + 7919) % 10_000;
        return _formula.LossPerMetre(new PipeFlow(0.1 + (_i * 1e-4), 0.6, 0.05e-3, 140, 0.012, 1.3e-6, 9.80665));
    }
}
