using BenchmarkDotNet.Running;
using UnitVent.Benchmarks;

BenchmarkSwitcher.FromAssembly(typeof(DemoBoard).Assembly).Run(args);
