using System.Collections.Immutable;
using CaptureZone.Jobs.Points;
using CaptureZone.Jobs.Tables;
using CaptureZone.Outputs.Text;
using CaptureZone.Sites;
using CaptureZone.Topology;
using CaptureZone.Tracing;

namespace CaptureZone.Jobs.Paths;

/// <summary>The table of paths' ends: metres and days; places in the site's coordinates.</summary>
public static class PathsCsv
{
    /// <summary>What a path has lost to streams on its way, share: nothing, as a model has no streams.</summary>
    internal const double LostToStreams = 0;

    /// <summary>Writes the table.</summary>
    /// <param name="site">The site.</param>
    /// <param name="rows">Its rows.</param>
    /// <param name="to">Where to.</param>
    public static void Write(SiteDocument site, ImmutableArray<PathRow> rows, TextWriter to)
    {
        CsvText.WriteLine(to, "name", "x", "y", "end_x", "end_y", "time_d", "length_m", "lost_to_streams", "fate");
        foreach ((NamedPoint start, PathEnd end, ImmutableArray<PathPoint> _) in rows)
        {
            CsvText.WriteLine(
                to,
                start.Name,
                CsvText.Figure(start.X),
                CsvText.Figure(start.Y),
                CsvText.Figure(site.Frame.SiteX(end.At)),
                CsvText.Figure(site.Frame.SiteY(end.At)),
                CsvText.Figure(end.Time),
                CsvText.Figure(end.Length),
                CsvText.Figure(LostToStreams),
                FateText.Token(end.Fate, site.Model));
        }
    }
}
