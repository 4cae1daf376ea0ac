using System.Collections.Immutable;
using CaptureZone.Outputs.Text;
using CaptureZone.Topology;
using CaptureZone.Tracing;
using NetTopologySuite.Geometries;

namespace CaptureZone.Outputs.Gis.Layers;

/// <summary>
/// Dividing streamlines and paths of plume water, in the direction in which they were followed, clipped to a frame three times as wide
/// and as high as the extent: they may run to a far circle where no map is of use. Length and time are those of the whole path.
/// </summary>
public static class PathsLayer
{
    /// <summary>Width of the frame on each side, in extents.</summary>
    private const double Margin = 1;

    private static readonly ImmutableArray<Column> Columns =
    [
        new("role", ColumnKind.Text),
        new("plume", ColumnKind.Text),
        new("well", ColumnKind.Text),
        new("fate", ColumnKind.Text),
        new("time_d", ColumnKind.Number),
        new("length_m", ColumnKind.Number),
        new("clipped", ColumnKind.Flag),
    ];

    /// <summary>The layer of a report.</summary>
    /// <param name="report">The report.</param>
    public static Layer Of(Report report)
    {
        Envelope frame = report.Answers.Extent.Copy();
        frame.ExpandBy(Margin * frame.Width, Margin * frame.Height);
        return new Layer(
            "paths", ShapeKind.Line, Columns, [.. report.Answers.Paths.SelectMany(path => Features(report, path, frame))]);
    }

    private static IEnumerable<Feature> Features(Report report, FlowPath path, Envelope frame)
    {
        MultiLineString shape = LineClip.Clip([.. path.Points.Select(point => point.At)], frame);
        if (!shape.IsEmpty)
        {
            Model model = report.Site.Model;
            yield return new Feature(
                shape,
                [
                    Token(path.Role),
                    path.From,
                    path.Fate.Kind == FateKind.Well ? FateText.WellName(path.Fate, model) : "",
                    FateText.Token(path.Fate, model),
                    path.Points[^1].Time,
                    path.Length,
                    path.Points.Any(point => !frame.Contains(point.At.Real, point.At.Imaginary)),
                ]);
        }
    }

    private static string Token(PathRole role) => role switch
    {
        PathRole.DividesDestinations => "divides destinations",
        PathRole.DividesOrigins => "divides origins",
        PathRole.FromPlume => "from plume",
        _ => throw new ArgumentOutOfRangeException(nameof(role), role, "The role has no name."),
    };
}
