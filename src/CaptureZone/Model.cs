using System.Collections.Immutable;
using CaptureZone.Aquifers;
using CaptureZone.Elements;
using CaptureZone.Elements.Regional;
using CaptureZone.Elements.Wells;

namespace CaptureZone;

/// <summary>
/// Everything that moves water at a site, in local metres and days. Nothing here knows of files, units or map projections.
/// </summary>
/// <param name="Aquifer">The aquifer.</param>
/// <param name="Regional">Regional flow and the known head.</param>
/// <param name="Elements">Everything else that is superposed, in the order of the site file.</param>
public sealed record Model(Aquifer Aquifer, RegionalFlow Regional, ImmutableArray<Element> Elements)
{
    /// <summary>The wells, in the order of the site file; a well's index is its place here.</summary>
    public ImmutableArray<Well> Wells => [.. Elements.OfType<Well>()];
}
