using CaptureZone.Outputs;
using CaptureZone.Outputs.Gis;
using CaptureZone.Outputs.Maps;
using CaptureZone.Outputs.Memos;
using CaptureZone.Outputs.Results;

namespace CaptureZone.Jobs.Runs;

/// <summary>The files of a run, each written from the report alone.</summary>
public static class RunFiles
{
    /// <summary>The folder of Shapefiles within the result folder.</summary>
    public const string ShapefileFolderName = "shapefiles";

    /// <summary>Writes all files into a folder; pictures with the memo that shows one, and data, are independent of each other.</summary>
    /// <param name="report">The report.</param>
    /// <param name="folder">An existing folder.</param>
    /// <param name="shapefiles">Whether Shapefiles are wanted too.</param>
    /// <param name="work">How.</param>
    /// <exception cref="OperationCanceledException">The work was stopped.</exception>
    public static void Write(Report report, string folder, bool shapefiles, Work work)
    {
        Action[] strands =
        [
            () => WritePages(report, folder, work),
            () => WriteData(report, folder, shapefiles, work),
        ];
        work.Workers.For(strands.Length, i => strands[i]());
    }

    private static void WritePages(Report report, string folder, Work work)
    {
        Begin(work, "drawing the map", 0);
        MapPictures map = PlanMap.Draw(report);
        File.WriteAllBytes(Path.Combine(folder, "map.png"), map.Png);
        File.WriteAllBytes(Path.Combine(folder, "map.svg"), map.Svg);
        Begin(work, "writing the memo", 0.6);
        MemoFiles.Write(report, map.Png, folder);
    }

    private static void WriteData(Report report, string folder, bool shapefiles, Work work)
    {
        Begin(work, "writing results and GIS files", 0.1);
        using (FileStream results = File.Create(Path.Combine(folder, "results.json")))
        {
            ResultsJson.Write(report, results);
        }

        work.Cancel.ThrowIfCancellationRequested();
        GeoJsonFiles.Write(report, folder);
        work.Cancel.ThrowIfCancellationRequested();
        GeoPackageFile.Write(report, Path.Combine(folder, "gis.gpkg"));
        if (shapefiles)
        {
            work.Cancel.ThrowIfCancellationRequested();
            string inner = Path.Combine(folder, ShapefileFolderName);
            Directory.CreateDirectory(inner);
            ShapefileFolder.Write(report, inner);
        }
    }

    private static void Begin(Work work, string step, double fraction)
    {
        work.Cancel.ThrowIfCancellationRequested();
        work.Progress?.Report(new Step(step, fraction));
    }
}
