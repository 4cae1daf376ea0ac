using System.Collections.Immutable;
using CaptureZone.Jobs.Runs;
using CaptureZone.Outputs;
using CaptureZone.Outputs.Text;
using CaptureZone.Sites.Coordinates;
using CaptureZone.Zones;

namespace CaptureZone.Jobs.Summaries;

/// <summary>What a run found, in words for someone who never saw this program.</summary>
public static class RunSummary
{
    /// <summary>Writes the summary: what went wrong first, the caution last.</summary>
    /// <param name="report">The report.</param>
    /// <param name="request">What was asked for.</param>
    /// <param name="to">Where to.</param>
    public static void Write(Report report, RunRequest request, TextWriter to)
    {
        to.WriteLine(report.Site.Title);
        CoordinateSystem coordinates = report.Site.Coordinates;
        to.WriteLine(coordinates.Name == coordinates.Stated
            ? $"{report.Site.FileName}, coordinates: {coordinates.Stated}"
            : $"{report.Site.FileName}, coordinates: {coordinates.Stated} ({coordinates.Name})");
        WriteFailedChecks(report, to);
        WriteWarnings(report, to);
        WritePlumes(report, to);
        WriteWells(report, to);
        WriteFiles(request, to);
        to.WriteLine();
        to.WriteLine(Caution.Text);
    }

    private static void WriteFailedChecks(Report report, TextWriter to)
    {
        ImmutableArray<Check> failed = [.. report.Answers.Checks.Where(check => !check.Passed)];
        if (failed.IsEmpty)
        {
            return;
        }

        Printer print = new(report.Site.Report.Units);
        to.WriteLine();
        to.WriteLine("FAILED: the calculation does not pass its own checks. Do not rely on these results.");
        TextTable.Write(to, [.. failed.Select(check =>
            new[] { check.Name, $"found {print.Ratio(check.Value)}", $"allowed {print.Ratio(check.Limit)}" })]);
    }

    private static void WriteWarnings(Report report, TextWriter to)
    {
        if (report.Answers.Findings.IsEmpty)
        {
            return;
        }

        to.WriteLine();
        to.WriteLine("Warnings");
        foreach (Finding finding in report.Answers.Findings)
        {
            to.WriteLine("  " + FindingText.Of(finding, report).Text);
        }
    }

    private static void WritePlumes(Report report, TextWriter to)
    {
        if (report.Answers.Plumes.IsEmpty)
        {
            return;
        }

        to.WriteLine();
        to.WriteLine("Plumes");
        foreach (PlumeAnswer answer in report.Answers.Plumes)
        {
            string name = report.Answers.Questions.Plumes[answer.Plume].Name;
            to.WriteLine($"  {name}: {(answer.Captured ? "capture predicted" : "NOT captured in whole")}");
            to.WriteLine("    " + VerdictText.Of(answer, report));
        }
    }

    private static void WriteWells(Report report, TextWriter to)
    {
        if (report.Answers.Wells.IsEmpty)
        {
            return;
        }

        to.WriteLine();
        to.WriteLine("Wells");
        List<string[]> rows = [["name", "purpose", "rate", "level at screen", "drawdown", "capture zone"]];
        rows.AddRange(report.Answers.Wells.Select(answer => WellRow(answer, report)));
        TextTable.Write(to, rows);
    }

    private static string[] WellRow(WellAnswer answer, Report report)
    {
        Printer print = new(report.Site.Report.Units);
        Elements.Wells.Well well = report.Site.Model.Wells[answer.Well];
        return
        [
            well.Name,
            well.Rate < 0 ? "injection" : WellText.Token(well.Purpose),
            print.Rate(Math.Abs(well.Rate)),
            print.Elevation(answer.HeadAtScreen),
            print.Length(answer.DrawdownAtScreen),
            ZoneText(answer.Zone, print),
        ];
    }

    private static string ZoneText(WellZone? zone, Printer print) => zone switch
    {
        null => "",
        { Area: { } area } => $"closed, {print.Area(area)}",
        { WidthUpgradient: { } width } => $"open upgradient, {print.Length(width)} wide far upgradient",
        _ => "without bounds",
    };

    private static void WriteFiles(RunRequest request, TextWriter to)
    {
        to.WriteLine();
        to.WriteLine($"Results in {request.Folder}");
        List<string[]> rows =
        [
            ["memo.docx, memo.md", "the memo, to complete and sign"],
            ["map.png, map.svg", "the plan"],
            ["gis.gpkg, *.geojson", "zones, paths, stagnation points, head contours for GIS"],
            ["results.json", "every figure, for other programs"],
        ];
        if (request.Shapefiles)
        {
            rows.Add([RunFiles.ShapefileFolderName + "/", "the layers as Shapefiles"]);
        }

        TextTable.Write(to, rows);
    }
}
