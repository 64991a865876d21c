using BenchmarkDotNet.Attributes;
using HeadToWatts.Memos;
using HeadToWatts.Studies;

namespace HeadToWatts.Benchmarks;

/// <summary>A whole memo with its figures.</summary>
[MemoryDiagnoser]
public class MemoBenchmarks
{
    private StudyResult _result = null!;

    [GlobalSetup]
    public void Setup() => _result = Study.RunAll(BenchmarkStudies.ThirtyYears())[0];

    [Benchmark]
    public int Memo() => Memos.Memo.Make(_result, _result.Show()).Length;
}
