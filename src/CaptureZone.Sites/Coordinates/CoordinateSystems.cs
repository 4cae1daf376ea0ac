using System.Diagnostics.CodeAnalysis;
using System.Globalization;
using System.Security;

namespace CaptureZone.Sites.Coordinates;

/// <summary>Reads the coordinate system that a site file states, and lets pass only what was checked.</summary>
public static class CoordinateSystems
{
    private const string EpsgPrefix = "EPSG:";

    /// <summary>Definitions have one or two thousand characters; a larger file, in bytes, is something else.</summary>
    private const int LargestFile = 65_536;

    /// <summary>Reads a stated system.</summary>
    /// <param name="stated">"EPSG:26914", "local m", "local ft", or the name of a .prj or .wkt file.</param>
    /// <param name="folder">Folder from which a relative file name is looked for: the site file's.</param>
    /// <param name="system">The system; null when it is refused.</param>
    /// <param name="problem">What was found, what is expected and how to mend it, in one line; empty when the system was read.</param>
    public static bool TryRead(string stated, string folder, [NotNullWhen(true)] out CoordinateSystem? system, out string problem)
    {
        string trimmed = stated.Trim();
        (system, problem) = FileOf(trimmed, folder) is { } path ? FromFile(trimmed, path)
            : CodeOf(trimmed) is { } code ? FromCode(trimmed, code)
            : trimmed switch
            {
                "local m" => (LocalSystem.In(trimmed, GridUnit.Metre), string.Empty),
                "local ft" => (LocalSystem.In(trimmed, GridUnit.Foot), string.Empty),
                _ => (null, CoordinateProblem.NotUnderstood(trimmed)),
            };
        return system is not null;
    }

    /// <summary>Path of the file that a stated system names; null when it names none.</summary>
    /// <param name="stated">The system as stated.</param>
    /// <param name="folder">Folder from which a relative file name is looked for.</param>
    public static string? FileOf(string stated, string folder)
    {
        string trimmed = stated.Trim();
        bool isFile = trimmed.EndsWith(".prj", StringComparison.OrdinalIgnoreCase)
            || trimmed.EndsWith(".wkt", StringComparison.OrdinalIgnoreCase);
        return isFile ? Path.Combine(folder, trimmed) : null;
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

    private static int? CodeOf(string stated) =>
        stated.StartsWith(EpsgPrefix, StringComparison.OrdinalIgnoreCase)
        && int.TryParse(stated.AsSpan(EpsgPrefix.Length), NumberStyles.None, CultureInfo.InvariantCulture, out int code)
            ? code
            : null;

    private static (CoordinateSystem? System, string Problem) FromCode(string stated, int code) => UtmZone.OfCode(code) is { } zone
        ? (ProjectedSystem.Of(stated, zone), string.Empty)
        : (null, CoordinateProblem.Code(stated, code));

    private static (CoordinateSystem? System, string Problem) FromFile(string stated, string path)
    {
        try
        {
            var file = new FileInfo(path);
            if (!file.Exists)
            {
                return (null, CoordinateProblem.FileMissing(stated));
            }

            return file.Length > LargestFile
                ? (null, CoordinateProblem.FileUnreadable(stated))
                : FromText(stated, File.ReadAllText(path).Trim());
        }
        catch (Exception e) when (e is IOException or UnauthorizedAccessException or SecurityException or ArgumentException)
        {
            return (null, CoordinateProblem.FileUnreadable(stated));
        }
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
