using System.Collections.Immutable;
using System.Text.Encodings.Web;
using System.Text.Json;
using CaptureZone.Elements.Wells;
using CaptureZone.Outputs.Text;
using CaptureZone.Topology;
using CaptureZone.Zones;

namespace CaptureZone.Outputs.Results;

/// <summary>
/// Writes <c>results.json</c>: metres and days, places in the site's coordinates, ten significant digits, null for what does not
/// exist. <c>docs/results.md</c> says what every field means, <c>docs/results.schema.json</c> what a file may hold.
/// </summary>
public static class ResultsJson
{
    private static readonly JsonWriterOptions Options = new()
    {
        Indented = true,
        NewLine = "\n",
        Encoder = JavaScriptEncoder.UnsafeRelaxedJsonEscaping,
    };

    /// <summary>Writes the results of a report.</summary>
    /// <param name="report">The report.</param>
    /// <param name="to">Where to; stays open.</param>
    /// <exception cref="IOException">The stream cannot be written.</exception>
    public static void Write(Report report, Stream to)
    {
        using Utf8JsonWriter json = new(to, Options);
        json.WriteStartObject();
        WriteHead(json, report);
        json.WriteObjects("stagnation_points", report.Answers.StagnationPoints, point => Write(json, report, point));
        json.WriteBoolean("stagnation_complete", report.Answers.StagnationComplete);
        json.WriteObjects("wells", report.Answers.Wells, well => Write(json, report, well));
        json.WriteObjects("plumes", report.Answers.Plumes, plume => Write(json, report, plume));
        json.WriteObjects("checks", report.Answers.Checks, check => Write(json, check));
        WriteWarnings(json, report);
        json.WriteEndObject();
        json.Flush();
        to.WriteByte((byte)'\n');
    }

    private static void WriteHead(Utf8JsonWriter json, Report report)
    {
        var site = report.Site;
        json.WriteStartObject("program");
        json.WriteString("name", "capturezone");
        json.WriteString("version", report.ProgramVersion);
        json.WriteEndObject();
        json.WriteStartObject("site");
        json.WriteString("title", site.Title);
        json.WriteString("file", site.FileName);
        json.WriteString("sha256", site.Sha256);
        json.WriteEndObject();
        json.WriteStartObject("units");
        json.WriteString("length", "m");
        json.WriteString("time", "d");
        json.WriteEndObject();
        json.WriteStartObject("coordinates");
        json.WriteString("crs", site.Coordinates.Stated);
        json.WriteString("name", site.Coordinates.Name);
        json.WriteString("unit", site.Coordinates.Unit);
        json.WriteString("vertical_datum", site.Report.VerticalDatum);
        json.WriteEndObject();
        WriteExtent(json, report);
        WriteKnownHead(json, report);
        json.WriteValue("contour_interval", report.Answers.ContourInterval);
    }

    private static void WriteExtent(Utf8JsonWriter json, Report report)
    {
        var extent = report.Answers.Extent;
        json.WriteStartArray("extent");
        json.WriteValue(report.Site.Frame.SiteX(new(extent.MinX, extent.MinY)));
        json.WriteValue(report.Site.Frame.SiteY(new(extent.MinX, extent.MinY)));
        json.WriteValue(report.Site.Frame.SiteX(new(extent.MaxX, extent.MaxY)));
        json.WriteValue(report.Site.Frame.SiteY(new(extent.MaxX, extent.MaxY)));
        json.WriteEndArray();
    }

    private static void WriteKnownHead(Utf8JsonWriter json, Report report)
    {
        var regional = report.Site.Model.Regional;
        json.WriteStartObject("known_head");
        json.WritePlace(report.Site.Frame, regional.HeadAt);
        json.WriteValue("head", regional.Head);
        json.WriteValue("nearest_well_distance", report.Answers.KnownHeadDistance);
        json.WriteValue("drawdown_change_at_double_distance", report.Answers.KnownHeadSensitivity);
        json.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter json, Report report, StagnationPoint point)
    {
        json.WritePlace(report.Site.Frame, point.At);
        json.WriteString("kind", StagnationText.Token(point.Kind));
        json.WriteNumber("multiplicity", point.Multiplicity);
        json.WriteValue("head", point.Head);
    }

    private static void Write(Utf8JsonWriter json, Report report, WellAnswer answer)
    {
        Well well = report.Site.Model.Wells[answer.Well];
        json.WriteString("name", well.Name);
        json.WritePlace(report.Site.Frame, well.At);
        json.WriteValue("rate", well.Rate);
        json.WriteString("purpose", WellText.Token(well.Purpose));
        json.WriteValue("radius", well.Radius);
        json.WriteValue("head_at_screen", answer.HeadAtScreen);
        json.WriteValue("drawdown_at_screen", answer.DrawdownAtScreen);
        json.WriteValue("largest_rate", answer.LargestRate);
        if (answer.Zone is { } zone)
        {
            json.WriteStartObject("zone");
            Write(json, report.Site.Model, zone);
            json.WriteEndObject();
        }
        else
        {
            json.WriteNull("zone");
        }

        json.WriteObjects("travel_time_zones", answer.TravelTimeZones, within =>
        {
            json.WriteValue("time", within.Time);
            json.WriteValue("area", within.Area);
            json.WriteValue("pore_volume_error", within.PoreVolumeError);
        });
    }

    private static void Write(Utf8JsonWriter json, Model model, WellZone zone)
    {
        json.WriteValue("area", zone.Area);
        json.WriteValue("area_in_extent", zone.AreaInExtent);
        json.WriteBoolean("open", zone.Open);
        json.WriteValue("width_at_well", zone.WidthAtWell);
        json.WriteValue("width_upgradient", zone.WidthUpgradient);
        json.WriteValue("stagnation_distance", zone.StagnationDistance);
        json.WriteObjects("water_from", zone.WaterFrom, source =>
        {
            json.WriteString("source", FateText.Source(source.Source, model));
            json.WriteValue("rate", source.Rate);
            json.WriteValue("share", source.Share);
        });
        json.WriteValue("side_flow", zone.SideFlow);
    }

    private static void Write(Utf8JsonWriter json, Report report, PlumeAnswer answer)
    {
        Plume plume = report.Answers.Questions.Plumes[answer.Plume];
        Model model = report.Site.Model;
        json.WriteString("name", plume.Name);
        json.WriteValue("retardation", plume.Retardation);
        json.WriteBoolean("captured", answer.Captured);
        json.WriteValue("captured_fraction", answer.CapturedFraction);
        json.WriteValue("margin", answer.Margin);
        json.WriteValue("margin_side", answer.MarginSide);
        json.WriteValue("margin_downgradient", answer.MarginDowngradient);
        json.WriteValue("margin_share", answer.MarginShare);
        WriteShares(json, "captured_by", answer.CapturedBy, share => json.WriteString("well", FateText.WellName(share.Fate, model)));
        WriteShares(json, "escapes_to", answer.EscapesTo, share => json.WriteString("fate", FateText.Token(share.Fate, model)));
        WriteArrival(json, answer.Arrival);
    }

    private static void WriteShares(
        Utf8JsonWriter json, string name, ImmutableArray<PlumeShare> shares, Action<PlumeShare> writeName) =>
        json.WriteObjects(name, shares, share =>
        {
            writeName(share);
            json.WriteValue("fraction", share.Fraction);
        });

    private static void WriteArrival(Utf8JsonWriter json, ArrivalTimes? arrival)
    {
        if (arrival is null)
        {
            json.WriteNull("arrival");
            return;
        }

        json.WriteStartObject("arrival");
        json.WriteValue("p5", arrival.P5);
        json.WriteValue("p50", arrival.P50);
        json.WriteValue("p95", arrival.P95);
        json.WriteEndObject();
    }

    private static void Write(Utf8JsonWriter json, Check check)
    {
        json.WriteString("name", check.Name);
        json.WriteValue("value", check.Value);
        json.WriteValue("limit", check.Limit);
        json.WriteBoolean("passed", check.Passed);
    }

    private static void WriteWarnings(Utf8JsonWriter json, Report report)
    {
        json.WriteStartArray("warnings");
        foreach (Finding finding in report.Answers.Findings)
        {
            FindingSentence told = FindingText.Of(finding, report);
            WriteWarning(json, told.Code, told.Text);
        }

        foreach (var complaint in report.Site.Warnings)
        {
            WriteWarning(json, "unusual-input", complaint.ToString());
        }

        json.WriteEndArray();
    }

    private static void WriteWarning(Utf8JsonWriter json, string code, string text)
    {
        json.WriteStartObject();
        json.WriteString("code", code);
        json.WriteString("text", text);
        json.WriteEndObject();
    }
}
