using System.Collections.Immutable;
using CaptureZone.Elements.Regional;
using CaptureZone.Tests.Flow;

namespace CaptureZone.Tests.Elements.Regional;

public sealed class RegionalFlowContract : ElementContract<RegionalFlow>
{
    protected override ImmutableArray<RegionalFlow> Elements { get; } = [Superposed.Regional];

    protected override double Size => 3500;
}
