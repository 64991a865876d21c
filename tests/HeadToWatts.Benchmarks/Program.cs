using BenchmarkDotNet.Configs;
using BenchmarkDotNet.Jobs;
using BenchmarkDotNet.Running;
using BenchmarkDotNet.Toolchains.InProcess.Emit;
using HeadToWatts.Benchmarks;

// dotnet run -c Release --project tests/HeadToWatts.Benchmarks -- --filter '*'
// In process: a build of its own would not know this repository's central packages.
var config = DefaultConfig.Instance.AddJob(Job.ShortRun.WithToolchain(InProcessEmitToolchain.Instance));
BenchmarkSwitcher.FromTypes([typeof(FrictionBenchmarks), typeof(StudyBenchmarks), typeof(MemoBenchmarks), typeof(FlowReadingBenchmarks), typeof(SplitBenchmarks), typeof(TransientBenchmarks)]).Run(args, config);
