using System.Diagnostics.CodeAnalysis;
using System.Globalization;
using System.Text;

namespace CaptureZone.Sites.Coordinates;

/// <summary>Reads the coordinate system that a site file states, and lets pass only what was checked.</summary>
public static class CoordinateSystems
{
    private const string EpsgPrefix = "EPSG:";

    /// <summary>Definitions have one or two thousand characters; a larger file, in bytes, is something else.</summary>
    private const int LargestFile = 65_536;

    /// <summary>Reads a stated system.</summary>
    /// <param name="stated">"EPSG:26914", "local m", "local ft", or the name of a .prj or .wkt file.</param>
    /// <param name="files">Where a file that it names is read from: the site file's folder.</param>
    /// <param name="system">The system; null when it is refused.</param>
    /// <param name="problem">What was found, what is expected and how to mend it, in one line; empty when the system was read.</param>
    public static bool TryRead(string stated, ISiteFiles files, [NotNullWhen(true)] out CoordinateSystem? system, out string problem)
    {
        string trimmed = stated.Trim();
        (system, problem) = NamesFile(trimmed) ? FromFile(trimmed, files)
            : CodeOf(trimmed) is { } code ? FromCode(trimmed, code)
            : trimmed switch
            {
                "local m" => (LocalSystem.In(trimmed, GridUnit.Metre), string.Empty),
                "local ft" => (LocalSystem.In(trimmed, GridUnit.Foot), string.Empty),
                _ => (null, CoordinateProblem.NotUnderstood(trimmed)),
            };
        return system is not null;
    }

    /// <summary>
    /// The frame of a site: its origin is the site's centre rounded to whole units, so that coordinates as a person writes them stay exact.
    /// </summary>
    /// <param name="system">The site's system.</param>
    /// <param name="centreX">Easting of the centre, in the site's unit.</param>
    /// <param name="centreY">Northing of the centre, in the site's unit.</param>
    public static SiteFrame FrameFor(CoordinateSystem system, double centreX, double centreY) =>
        new(Math.Round(centreX), Math.Round(centreY), system.MetresPerUnit);

    /// <summary>
    /// The UTM zone on WGS 84 of a place, "EPSG:32614 (WGS 84 / UTM zone 14N)", for a message; null outside the grid. By meridians
    /// alone: the wider zones off Norway and Svalbard are not followed.
    /// </summary>
    /// <param name="lon">Longitude, degrees.</param>
    /// <param name="lat">Latitude, degrees.</param>
    public static string? UtmSuggestion(double lon, double lat) => UtmZone.At(lon, lat) is { } zone
        ? string.Create(CultureInfo.InvariantCulture, $"EPSG:{zone.Epsg} ({zone.Definition.Name})")
        : null;

    private static bool NamesFile(string stated) =>
        stated.EndsWith(".prj", StringComparison.OrdinalIgnoreCase) || stated.EndsWith(".wkt", StringComparison.OrdinalIgnoreCase);

    private static int? CodeOf(string stated) =>
        stated.StartsWith(EpsgPrefix, StringComparison.OrdinalIgnoreCase)
        && int.TryParse(stated.AsSpan(EpsgPrefix.Length), NumberStyles.None, CultureInfo.InvariantCulture, out int code)
            ? code
            : null;

    private static (CoordinateSystem? System, string Problem) FromCode(string stated, int code) => UtmZone.OfCode(code) is { } zone
        ? (ProjectedSystem.Of(stated, zone), string.Empty)
        : (null, CoordinateProblem.Code(stated, code));

    private static (CoordinateSystem? System, string Problem) FromFile(string stated, ISiteFiles files)
    {
        if (!files.TryRead(stated, out byte[]? bytes, out string? problem))
        {
            return (null, CoordinateProblem.File(stated, problem));
        }

        return bytes.Length > LargestFile
            ? (null, CoordinateProblem.File(stated, "is too large for the definition of a coordinate system"))
            : FromText(stated, Encoding.UTF8.GetString(bytes).Trim('\uFEFF', ' ', '\t', '\r', '\n'));
    }

    private static (CoordinateSystem? System, string Problem) FromText(string stated, string text)
    {
        try
        {
            return (ProjectedSystem.Of(stated, DefinitionReader.Read(text), text), string.Empty);
        }
        catch (RefusedDefinitionException refused)
        {
            return (null, CoordinateProblem.Definition(stated, refused.Message));
        }
    }
}
