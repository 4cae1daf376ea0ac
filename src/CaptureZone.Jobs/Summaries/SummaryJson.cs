using System.Collections.Immutable;
using System.Text;
using System.Text.Encodings.Web;
using System.Text.Json;
using CaptureZone.Elements.Wells;
using CaptureZone.Jobs.Heads;
using CaptureZone.Jobs.Paths;
using CaptureZone.Jobs.Points;
using CaptureZone.Jobs.Runs;
using CaptureZone.Outputs;
using CaptureZone.Outputs.Results;
using CaptureZone.Outputs.Text;
using CaptureZone.Sites;
using CaptureZone.Tracing;
using CaptureZone.Zones;

namespace CaptureZone.Jobs.Summaries;

/// <summary>
/// The summaries for other programs: one JSON object, with the keys, units and order of <c>results.json</c> or of the CSV tables.
/// </summary>
public static class SummaryJson
{
    private static readonly JsonWriterOptions _options = new()
    {
        Indented = true,
        NewLine = "\n",
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    };

    /// <summary>What a run found and where it is.</summary>
    /// <param name="report">The report.</param>
    /// <param name="request">What was asked for.</param>
    /// <param name="to">Where to.</param>
    public static void WriteRun(Report report, RunRequest request, TextWriter to) => Write(to, json =>
    {
        SiteAnswers answers = report.Answers;
        WriteSite(json, report.Site);
        json.WriteString("folder", request.Folder);
        json.WriteBoolean("checks_passed", answers.Checks.All(check => check.Passed));
        json.WriteObjects("failed_checks", [.. answers.Checks.Where(check => !check.Passed)], (Check check) => WriteCheck(json, check));
        json.WriteBoolean("stagnation_complete", answers.StagnationComplete);
        json.WriteObjects("warnings", answers.Findings, finding => WriteFinding(json, FindingText.Of(finding, report)));
        json.WriteObjects("plumes", answers.Plumes, plume => WritePlume(json, report, plume));
        json.WriteObjects("wells", answers.Wells, well => WriteWell(json, report, well));
        json.WriteString("caution", Caution.Text);
    });

    /// <summary>What was understood of a site file, or what is wrong with it.</summary>
    /// <param name="site">The site; null when it cannot be run.</param>
    /// <param name="complaints">What is wrong or unusual.</param>
    /// <param name="to">Where to.</param>
    public static void WriteCheck(SiteDocument? site, ImmutableArray<Complaint> complaints, TextWriter to) => Write(to, json =>
    {
        json.WriteBoolean("runs", site is not null);
        json.WriteObjects("complaints", complaints, complaint => WriteComplaint(json, complaint));
        if (site is not null)
        {
            WriteSite(json, site);
            json.WriteObjects("inputs", site.Inputs, input => WriteInput(json, input));
        }
    });

    /// <summary>The table of heads.</summary>
    /// <param name="rows">Its rows.</param>
    /// <param name="to">Where to.</param>
    public static void WriteHeads(ImmutableArray<HeadRow> rows, TextWriter to) => Write(to, json =>
        json.WriteObjects("heads", rows, row =>
        {
            WritePoint(json, row.Point);
            json.WriteValue("head_m", row.Head);
            json.WriteValue("thickness_m", row.Thickness);
            json.WriteValue("qx_m2d", row.Discharge.Real);
            json.WriteValue("qy_m2d", row.Discharge.Imaginary);
            json.WriteValue("vx_md", row.Velocity.Real);
            json.WriteValue("vy_md", row.Velocity.Imaginary);
            json.WriteString("note", row.Note);
        }));

    /// <summary>The table of paths' ends.</summary>
    /// <param name="site">The site.</param>
    /// <param name="rows">Its rows.</param>
    /// <param name="to">Where to.</param>
    public static void WritePaths(SiteDocument site, ImmutableArray<PathRow> rows, TextWriter to) => Write(to, json =>
        json.WriteObjects("paths", rows, row =>
        {
            WritePoint(json, row.Start);
            PathEnd end = row.End;
            json.WriteValue("end_x", site.Frame.SiteX(end.At));
            json.WriteValue("end_y", site.Frame.SiteY(end.At));
            json.WriteValue("time_d", end.Time);
            json.WriteValue("length_m", end.Length);
            json.WriteValue("lost_to_streams", PathsCsv.LostToStreams);
            json.WriteString("fate", FateText.Token(end.Fate, site.Model));
        }));

    private static void Write(TextWriter to, Action<Utf8JsonWriter> body)
    {
        using MemoryStream bytes = new();
        using (Utf8JsonWriter json = new(bytes, _options))
        {
            json.WriteStartObject();
            body(json);
            json.WriteEndObject();
        }

        to.WriteLine(Encoding.UTF8.GetString(bytes.ToArray()));
    }

    private static void WriteSite(Utf8JsonWriter json, SiteDocument site)
    {
        json.WriteStartObject("site");
        json.WriteString("title", site.Title);
        json.WriteString("file", site.FileName);
        json.WriteString("sha256", site.Sha256);
        json.WriteEndObject();
    }

    private static void WriteCheck(Utf8JsonWriter json, Check check)
    {
        json.WriteString("name", check.Name);
        json.WriteValue("value", check.Value);
        json.WriteValue("limit", check.Limit);
    }

    private static void WriteFinding(Utf8JsonWriter json, FindingSentence finding)
    {
        json.WriteString("code", finding.Code);
        json.WriteString("text", finding.Text);
    }

    private static void WritePlume(Utf8JsonWriter json, Report report, PlumeAnswer plume)
    {
        json.WriteString("name", report.Answers.Questions.Plumes[plume.Plume].Name);
        json.WriteBoolean("captured", plume.Captured);
        json.WriteValue("captured_fraction", plume.CapturedFraction);
        json.WriteValue("margin", plume.Margin);
    }

    private static void WriteWell(Utf8JsonWriter json, Report report, WellAnswer answer)
    {
        Well well = report.Site.Model.Wells[answer.Well];
        json.WriteString("name", well.Name);
        json.WriteValue("rate", well.Rate);
        json.WriteString("purpose", WellText.Token(well.Purpose));
        json.WriteValue("head_at_screen", answer.HeadAtScreen);
        json.WriteValue("drawdown_at_screen", answer.DrawdownAtScreen);
        json.WriteValue("largest_rate", answer.LargestRate);
        if (answer.Zone is { } zone)
        {
            json.WriteValue("area", zone.Area);
            json.WriteBoolean("open", zone.Open);
            json.WriteValue("width_upgradient", zone.WidthUpgradient);
        }
    }

    private static void WriteComplaint(Utf8JsonWriter json, Complaint complaint)
    {
        json.WriteString("file", complaint.File);
        json.WriteNumber("line", complaint.Line);
        json.WriteNumber("column", complaint.Column);
        json.WriteString("severity", complaint.Severity == Severity.Error ? "error" : "warning");
        json.WriteString("text", complaint.Text);
    }

    private static void WriteInput(Utf8JsonWriter json, InputEntry input)
    {
        json.WriteString("key", input.Key);
        json.WriteString("written", input.Written);
        json.WriteValue("value", input.Value);
        json.WriteString("source", input.Source);
    }

    private static void WritePoint(Utf8JsonWriter json, NamedPoint point)
    {
        json.WriteString("name", point.Name);
        json.WriteValue("x", point.X);
        json.WriteValue("y", point.Y);
    }
}
