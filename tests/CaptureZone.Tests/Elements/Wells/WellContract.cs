using System.Collections.Immutable;
using CaptureZone.Elements.Wells;
using CaptureZone.Tests.Flow;

namespace CaptureZone.Tests.Elements.Wells;

/// <summary>Thirteen wells: three full vectors of four and one that is not.</summary>
public sealed class WellContract : ElementContract<Well>
{
    protected override ImmutableArray<Well> Elements { get; } = [.. Superposed.Wells(13, seed: 2)];

    protected override double Size => 750;
}
