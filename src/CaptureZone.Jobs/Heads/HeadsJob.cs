using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;
using CaptureZone.Jobs.Points;
using CaptureZone.Sites;

namespace CaptureZone.Jobs.Heads;

/// <summary>Head and flow at one point; NaN where there is none.</summary>
/// <param name="Point">The point.</param>
/// <param name="Head">Head, m elevation.</param>
/// <param name="Thickness">Saturated thickness, m.</param>
/// <param name="Discharge">Discharge vector Qx + i Qy, m2/d.</param>
/// <param name="Velocity">Average linear velocity of ground water, m/d.</param>
/// <param name="Note">Why there is no value; else empty.</param>
public sealed record HeadRow(NamedPoint Point, double Head, double Thickness, Complex Discharge, Complex Velocity, string Note);

/// <summary>Head and flow at points.</summary>
public static class HeadsJob
{
    private static readonly Complex _nothing = new(double.NaN, double.NaN);

    /// <summary>Head and flow at each point.</summary>
    /// <param name="site">The site.</param>
    /// <param name="points">The points.</param>
    /// <exception cref="InputRefusedException">A well takes more than the aquifer yields.</exception>
    public static ImmutableArray<HeadRow> At(SiteDocument site, ImmutableArray<NamedPoint> points)
    {
        FlowField field = SiteFlow.Solve(site);
        return [.. points.Select(point => At(site, field, point))];
    }

    private static HeadRow At(SiteDocument site, FlowField field, NamedPoint point)
    {
        Complex at = site.Frame.ToLocal(point.X, point.Y);
        if (site.Model.Wells.FirstOrDefault(well => Complex.Abs(at - well.At) < well.Radius) is Well well)
        {
            return new HeadRow(point, double.NaN, double.NaN, _nothing, _nothing, $"inside the screen of {well.Name}");
        }

        FlowAt flow = field.FlowAt(at);
        Aquifer aquifer = field.AquiferAt(at);
        double thickness = aquifer.SaturatedThickness(flow.Potential);
        return thickness > 0
            ? new HeadRow(
                point, aquifer.HeadOf(flow.Potential), thickness, flow.Discharge, flow.Discharge / (aquifer.Porosity * thickness), "")
            : new HeadRow(point, double.NaN, 0, _nothing, _nothing, "dry");
    }
}
