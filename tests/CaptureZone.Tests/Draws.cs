namespace CaptureZone.Tests;

/// <summary>The seed of all property tests: the same draws on every machine and in every run.</summary>
internal static class Draws
{
    internal const string Seed = "(20261201,17)";
}
