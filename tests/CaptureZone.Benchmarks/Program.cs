using BenchmarkDotNet.Running;

namespace CaptureZone.Benchmarks;

/// <summary>The command line's entry point.</summary>
public static class Program
{
    /// <summary>Runs the benchmarks that the arguments choose; <c>--filter "*"</c> runs all.</summary>
    public static void Main(string[] args) => BenchmarkSwitcher.FromAssembly(typeof(Program).Assembly).Run(args);
}
