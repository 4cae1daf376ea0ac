using NetTopologySuite.Geometries;
using Dimension = CaptureZone.Sites.Units.Dimension;

namespace CaptureZone.Sites.Reading.Sections;

/// <summary>Regional flow as the file gives it.</summary>
/// <param name="Gradient">Hydraulic gradient.</param>
/// <param name="Direction">The way the water moves, radians counter-clockwise from east.</param>
/// <param name="Head">The known head, m.</param>
/// <param name="HeadAt">Where it is known, in the site's coordinates.</param>
/// <param name="HeadOffset">Where the head stands in the file.</param>
/// <param name="HeadAtOffset">Where its place stands in the file.</param>
internal sealed record RegionalDraft(
    double? Gradient, double? Direction, double? Head, Coordinate? HeadAt, int HeadOffset, int HeadAtOffset);

/// <summary>Reads [regional_flow].</summary>
internal static class RegionalFlowSection
{
    private static readonly Field Gradient =
        new("gradient", "Hydraulic gradient", "0.003") { Required = true, Limit = Limit.NotNegative, Usual = UsualRange.Gradient };

    private static readonly Field FlowsToward =
        new("flows_toward", "Flow direction, clockwise from grid north", "112") { Limit = Limit.Compass };

    private static readonly Field Head = new("head", "Known head", "231.6 m") { Required = true };
    private static readonly Field HeadAt = new("head_at", "Place of the known head", "[561200.0, 4641900.0]") { Required = true };

    /// <summary>The regional flow.</summary>
    /// <param name="table">The table.</param>
    public static RegionalDraft Read(TableReader table)
    {
        double? gradient = table.Number(Gradient, QuantityKind.Ratio);
        double? toward = table.Number(FlowsToward, QuantityKind.Direction);
        double? head = table.Quantity(Head, Dimension.Length);
        Coordinate? at = table.Place(HeadAt);
        if (!table.Has("flows_toward") && gradient is > 0)
        {
            table.Missing(
                "flows_toward",
                "[regional_flow] lacks flows_toward; add a line such as flows_toward = 112 (degrees clockwise from grid north)");
        }

        table.Finish();
        double? direction = gradient == 0 && !table.Has("flows_toward") ? 0 : (90 - toward) * Math.PI / 180;
        return new RegionalDraft(gradient, direction, head, at, table.PlaceOf("head"), table.PlaceOf("head_at"));
    }
}
