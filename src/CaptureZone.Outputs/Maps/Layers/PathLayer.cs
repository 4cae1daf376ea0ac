using CaptureZone.Topology;

namespace CaptureZone.Outputs.Maps;

/// <summary>Dividing streamlines and the paths of plume water.</summary>
/// <param name="scene">What is drawn.</param>
internal sealed class PathLayer(MapScene scene) : IMapLayer
{
    private static readonly (PathRole Role, Pen Pen, string Text)[] Kinds =
    [
        (PathRole.FromPlume, Look.PlumePathPen, "Path of plume water, a selection"),
        (PathRole.DividesDestinations, Look.DestinationsPen, "Dividing streamline: bounds where water goes to"),
        (PathRole.DividesOrigins, Look.OriginsPen, "Dividing streamline: bounds where water comes from"),
    ];

    /// <summary>More paths than this from one plume hide it.</summary>
    private const int MostPerPlume = 8;

    private readonly Dictionary<PathRole, Shape> _shapes = Chosen(scene.Answers.Paths).GroupBy(path => path.Role).ToDictionary(
        group => group.Key,
        group => new Shape([.. group.SelectMany(path => scene.View.Line([.. path.Points.Select(point => point.At)]).Traces)]));

    /// <summary>All dividing streamlines; of each plume's paths some, evenly spread.</summary>
    private static IEnumerable<FlowPath> Chosen(IEnumerable<FlowPath> paths) =>
        paths.GroupBy(path => (path.Role, path.From)).SelectMany(group =>
        {
            FlowPath[] all = [.. group];
            int every = group.Key.Role == PathRole.FromPlume ? (all.Length + MostPerPlume - 1) / MostPerPlume : 1;
            return all.Where((_, i) => i % every == 0);
        });

    /// <inheritdoc/>
    public string Name => "paths";

    /// <inheritdoc/>
    public IEnumerable<LegendItem> Legend =>
        Kinds.Where(kind => _shapes.ContainsKey(kind.Role)).Select(kind => LegendItem.Line(kind.Text, kind.Pen));

    /// <inheritdoc/>
    public void Draw(IMapCanvas canvas)
    {
        foreach ((PathRole role, Pen pen, _) in Kinds)
        {
            if (_shapes.TryGetValue(role, out Shape? shape))
            {
                canvas.Stroke(shape, pen);
            }
        }
    }
}
