using System.Globalization;

namespace CaptureZone.Sites.Coordinates;

/// <summary>What is wrong with a stated coordinate system, in one line each: what was found, what is expected, how to mend it.</summary>
internal static class CoordinateProblem
{
    /// <summary>How to find the fitting UTM zone.</summary>
    public const string UtmHint =
        "use a projected system, such as the site's UTM zone: EPSG:326zz (WGS 84, north), EPSG:327zz (WGS 84, south), EPSG:269zz (NAD83) "
        + "or EPSG:258zz (ETRS89), where zz is 1 + the whole part of (longitude + 180) / 6";

    private const string FileHint =
        "save the system's definition as a .prj file beside the site file and give that file's name, such as crs = \"site.prj\"";

    /// <summary>A text that is none of the ways to state a system.</summary>
    public static string NotUnderstood(string stated)
    {
        string found = $"{Quote(stated)} is not a coordinate system";
        if (stated.StartsWith("local", StringComparison.OrdinalIgnoreCase))
        {
            return $"{found}; local coordinates are \"local m\" or \"local ft\"";
        }

        return int.TryParse(stated, NumberStyles.None, CultureInfo.InvariantCulture, out int code)
            ? string.Create(CultureInfo.InvariantCulture, $"{found}; write \"EPSG:{code}\" if that code is meant")
            : $"{found}; give an EPSG code such as \"EPSG:32614\", \"local m\", \"local ft\", or the name of a .prj or .wkt file";
    }

    /// <summary>A code that is not known.</summary>
    public static string Code(string stated, int code) => code switch
    {
        3857 or 900913 or 102100 or 3785 =>
            $"{Quote(stated)} is web mercator, whose metres are not metres on the ground; {UtmHint}",
        _ when GeographicName(code) is { } name =>
            $"{Quote(stated)} is longitude/latitude ({name}), not a plane system in metres or feet; {UtmHint}",
        _ => $"{Quote(stated)} is not among the codes that are known (UTM zones: EPSG:32601-32660, 32701-32760, 26901-26923, "
            + $"25828-25838); {FileHint}",
    };

    /// <summary>A file that cannot be used.</summary>
    /// <param name="stated">Its name.</param>
    /// <param name="problem">Why, in words that follow its name.</param>
    public static string File(string stated, string problem) =>
        $"{Quote(stated)} {problem}; put the definition there, or give an EPSG code such as \"EPSG:32614\"";

    /// <summary>A definition that is refused.</summary>
    public static string Definition(string stated, string reason) => OneLine($"{Quote(stated)} {reason}");

    private static string? GeographicName(int code) => code switch
    {
        4267 => "NAD27",
        4979 => "WGS 84, three-dimensional",
        _ => Datum.Checked.FirstOrDefault(datum => datum.GeographicEpsg == code)?.Name,
    };

    private static string Quote(string text) => $"'{OneLine(text)}'";

    private static string OneLine(string text) => string.Concat(text.Select(c => char.IsControl(c) ? ' ' : c));
}
