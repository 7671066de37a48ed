using BenchmarkDotNet.Configs;
using BenchmarkDotNet.Jobs;
using BenchmarkDotNet.Toolchains.InProcess.Emit;

namespace UnitVent.Benchmarks;

/// <summary>Benchmarks run in the process that was started, so that nothing is built a second time.</summary>
internal sealed class InThisProcess : ManualConfig
{
    public InThisProcess() => AddJob(Job.Default.WithToolchain(InProcessEmitToolchain.Instance).WithWarmupCount(5).WithIterationCount(15));
}
