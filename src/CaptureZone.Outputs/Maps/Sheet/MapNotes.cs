using System.Globalization;
using CaptureZone.Sites;
using CaptureZone.Sites.Coordinates;

namespace CaptureZone.Outputs.Maps;

/// <summary>What a map says in words: systems, who and when, and what it could not show.</summary>
internal static class MapNotes
{
    /// <summary>More names than this are counted, not listed.</summary>
    private const int MostNames = 12;

    /// <summary>The notes of a map.</summary>
    /// <param name="scene">What is drawn.</param>
    /// <param name="placement">Its labels.</param>
    public static IEnumerable<string> Of(MapScene scene, LabelPlacement placement)
    {
        SiteDocument site = scene.Report.Site;
        ReportSettings settings = site.Report;
        yield return $"Coordinates: {System(site.Coordinates)}";
        yield return settings.VerticalDatum.Length > 0 ? $"Vertical datum: {settings.VerticalDatum}" : "Vertical datum not given";
        (string Label, string Text)[] given =
        [
            ("Project", settings.Project),
            ("Prepared for", settings.PreparedFor),
            ("Prepared by", settings.PreparedBy),
            ("Date", settings.Date),
            ("Not in the frame", Names([.. scene.Model.Wells.Where(well => !scene.View.Shows(well.At)).Select(well => well.Name)])),
            ("Names without room", Names([.. placement.LeftOut.Select(label => label.Block.Lines[0].Text)])),
        ];
        foreach ((string label, string text) in given.Where(note => note.Text.Length > 0))
        {
            yield return $"{label}: {text}";
        }

        yield return $"Calculated with capturezone {scene.Report.ProgramVersion}";
    }

    private static string System(CoordinateSystem system)
    {
        string code = system.Epsg is { } epsg ? string.Create(CultureInfo.InvariantCulture, $" (EPSG:{epsg})") : "";
        return $"{system.Name}{code}, {system.Unit}";
    }

    private static string Names(IReadOnlyList<string> names) => names.Count > MostNames
        ? string.Create(CultureInfo.InvariantCulture, $"{string.Join(", ", names.Take(MostNames))} and {names.Count - MostNames} more")
        : string.Join(", ", names);
}
