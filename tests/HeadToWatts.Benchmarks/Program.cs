using BenchmarkDotNet.Running;
using HeadToWatts.Benchmarks;

// dotnet run -c Release --project tests/HeadToWatts.Benchmarks -- --filter '*'
BenchmarkSwitcher.FromTypes([typeof(FrictionBenchmarks), typeof(StudyBenchmarks), typeof(MemoBenchmarks)]).Run(args);
