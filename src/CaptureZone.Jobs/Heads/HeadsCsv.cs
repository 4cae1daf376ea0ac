using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Jobs.Points;
using CaptureZone.Jobs.Tables;

namespace CaptureZone.Jobs.Heads;

/// <summary>The table of heads: metres and days; x and y in the site's coordinates.</summary>
public static class HeadsCsv
{
    /// <summary>Writes the table.</summary>
    /// <param name="rows">Its rows.</param>
    /// <param name="to">Where to.</param>
    public static void Write(ImmutableArray<HeadRow> rows, TextWriter to)
    {
        CsvText.WriteLine(to, "name", "x", "y", "head_m", "thickness_m", "qx_m2d", "qy_m2d", "vx_md", "vy_md", "note");
        foreach ((NamedPoint point, double head, double thickness, Complex q, Complex v, string note) in rows)
        {
            CsvText.WriteLine(
                to,
                point.Name,
                CsvText.Figure(point.X),
                CsvText.Figure(point.Y),
                CsvText.Figure(head),
                CsvText.Figure(thickness),
                CsvText.Figure(q.Real),
                CsvText.Figure(q.Imaginary),
                CsvText.Figure(v.Real),
                CsvText.Figure(v.Imaginary),
                note);
        }
    }
}
