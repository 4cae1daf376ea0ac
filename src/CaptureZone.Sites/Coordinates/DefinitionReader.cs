using System.Collections.Immutable;

namespace CaptureZone.Sites.Coordinates;

/// <summary>A definition that is refused; the message says why and what to do instead.</summary>
/// <param name="message">Without the file's name, which the caller knows.</param>
internal sealed class RefusedDefinitionException(string message) : Exception(message);

/// <summary>
/// Reads well-known text into a definition and lets pass only what was checked against independent values. Everything that it does
/// not know is refused: a part that is passed over can move a site by hundreds of metres.
/// </summary>
internal static class DefinitionReader
{
    /// <summary>How far ellipsoids, degrees and ratios may be off as a share: the digits that definitions print.</summary>
    private const double PrintTolerance = 1e-9;

    private const double DegreeInRadians = Math.PI / 180;

    private const string SaveAgain = "save the definition again";

    private const string KnownDatums = "known are WGS 84, NAD83 (also HARN, CORS96, NSRS2007, 2011, CSRS) and ETRS89";

    private const string KnownProjections =
        "known are Transverse_Mercator, Lambert_Conformal_Conic with two standard parallels, and Albers";

    /// <summary>Reads a definition.</summary>
    /// <param name="text">WKT1 or the form of .prj files.</param>
    /// <exception cref="RefusedDefinitionException">It is not well-known text, or holds something that was not checked.</exception>
    public static ProjectedDefinition Read(string text)
    {
        WktNode root = WktParser.Parse(text) ?? throw new RefusedDefinitionException(
            "is not one definition in well-known text (PROJCS[...]); save the system's definition again as .prj, "
            + "without a vertical system");
        CheckRoot(root);
        CheckParts(root, "GEOGCS", "PROJECTION", "PARAMETER", "UNIT", "AXIS", "AUTHORITY", "METADATA");
        CheckAxes(root);
        Datum datum = ReadDatum(Only(root, "GEOGCS"));
        ProjectionMethod method = ReadMethod(Only(root, "PROJECTION"), root);
        var definition = new ProjectedDefinition(root.Name, datum, method, ReadParameters(root, method), ReadUnit(Only(root, "UNIT")));
        CheckAuthority(root, definition);
        return definition;
    }

    /// <summary>Whether a definition that can be read has the form of .prj files, whose names of datums start with "D_".</summary>
    /// <param name="text">The text.</param>
    public static bool IsEsri(string text) => WktParser.Parse(text) is { } root
        && root.Of("GEOGCS")
            .SelectMany(geographic => geographic.Of("DATUM"))
            .Any(datum => datum.Name.StartsWith("D_", StringComparison.Ordinal));

    /// <summary>A code that is known must belong to the definition: a GIS may follow either.</summary>
    private static void CheckAuthority(WktNode root, ProjectedDefinition definition)
    {
        double? code = root.Of("AUTHORITY").FirstOrDefault(authority => authority.Name == "EPSG")?.Number(1);
        UtmZone? claimed = code is > 0 and < int.MaxValue ? UtmZone.OfCode((int)code) : null;
        Require(
            claimed is null || claimed.Definition.SameSystem(definition),
            $"says that it is {claimed?.Definition.Name} by its code, but defines another system; {SaveAgain}");
    }

    private static void CheckRoot(WktNode root)
    {
        string? problem = root.Keyword switch
        {
            "PROJCS" => null,
            "GEOGCS" or "GEOGCRS" or "GEODCRS" =>
                $"is longitude/latitude ({root.Name}), not a plane system in metres or feet; {CoordinateProblem.UtmHint}",
            "PROJCRS" or "BOUNDCRS" or "COMPOUNDCRS" or "ENGCRS" =>
                $"is written in WKT2 ({root.Keyword}), which is not read; save the definition as WKT1 or as an ESRI .prj",
            "COMPD_CS" => "joins a vertical system to the plane one (COMPD_CS); save the plane system alone (its PROJCS[...] part)",
            "LOCAL_CS" => "is a local system; write crs = \"local m\" or \"local ft\"",
            _ => $"is a {root.Keyword}, not a projected system (PROJCS); give the definition of the site's plane system",
        };
        Require(problem is null, problem ?? string.Empty);
    }

    private static Datum ReadDatum(WktNode geographic)
    {
        CheckParts(geographic, "DATUM", "PRIMEM", "UNIT", "AXIS", "AUTHORITY", "METADATA");
        WktNode node = Only(geographic, "DATUM");
        CheckParts(node, "SPHEROID", "TOWGS84", "AUTHORITY");
        Datum datum = Datum.Find(node.Name)
            ?? throw new RefusedDefinitionException($"has the datum '{node.Name}', which was not checked; {KnownDatums}");
        CheckEllipsoid(Only(node, "SPHEROID"), datum);
        bool shifts = node.Of("TOWGS84").Any(shift => Enumerable.Range(0, shift.Values.Length).Any(i => shift.Number(i) is not 0));
        Require(!shifts, "has a TOWGS84 shift that is not zero, which was not checked; use the definition without it");
        Require(
            Only(geographic, "PRIMEM").Number(1) is 0,
            "has another prime meridian than Greenwich, which was not checked; use a system of Greenwich");
        Require(
            Near(Only(geographic, "UNIT").Number(1), DegreeInRadians),
            "gives angles in another unit than degrees, which was not checked; use a system in degrees");
        return datum;
    }

    private static void CheckEllipsoid(WktNode spheroid, Datum datum)
    {
        bool same = Near(spheroid.Number(1), datum.Ellipsoid.SemiMajorAxis) && Near(spheroid.Number(2), datum.Ellipsoid.InverseFlattening);
        Require(
            same,
            $"has another ellipsoid ('{spheroid.Name}') than its datum {datum.Name} has ({datum.Ellipsoid.Name}); {SaveAgain}");
    }

    private static ProjectionMethod ReadMethod(WktNode projection, WktNode root)
    {
        bool oneParallel = projection.Name.StartsWith("Lambert_Conformal_Conic", StringComparison.OrdinalIgnoreCase)
            && !root.Of("PARAMETER").Any(parameter => Plain(parameter.Name) == "STANDARDPARALLEL2");
        string name = oneParallel ? $"{projection.Name}' with one standard parallel" : $"{projection.Name}'";
        return (oneParallel ? null : ProjectionMethod.Find(projection.Name))
            ?? throw new RefusedDefinitionException($"has the projection '{name}, which was not checked; {KnownProjections}");
    }

    private static ImmutableArray<double> ReadParameters(WktNode root, ProjectionMethod method)
    {
        WktNode[] given = [.. root.Of("PARAMETER")];
        WktNode? unknown = given.FirstOrDefault(node => !method.Parameters.Any(parameter => Names(parameter, node)));
        Require(unknown is null, $"has the parameter '{unknown?.Name}', which {method.WktName} does not have; {SaveAgain}");
        ImmutableArray<double> values = [.. method.Parameters.Select(parameter => ReadParameter(given, parameter))];
        if (method != ProjectionMethod.TransverseMercator)
        {
            CheckParallels(values[2], values[3]);
        }

        return values;
    }

    private static double ReadParameter(WktNode[] given, ProjectionParameterName parameter)
    {
        WktNode[] named = [.. given.Where(node => Names(parameter, node))];
        double value = named is [{ } one] && one.Number(1) is { } number
            ? number
            : throw new RefusedDefinitionException($"must give the parameter '{parameter.WktName}' once, as a number; {SaveAgain}");
        double limit = parameter.Kind switch
        {
            ParameterKind.Latitude => 90,
            ParameterKind.Longitude => 180,
            ParameterKind.Scale => 2,
            _ => double.MaxValue,
        };
        bool possible = Math.Abs(value) <= limit && (parameter.Kind != ParameterKind.Scale || value > 0);
        Require(possible, $"has an impossible value for the parameter '{parameter.WktName}'; {SaveAgain}");
        return value;
    }

    /// <summary>Parallels that mirror each other in the equator make the cone a cylinder, for which the formulas fail.</summary>
    private static void CheckParallels(double first, double second) => Require(
        Math.Abs(first + second) > PrintTolerance && Math.Abs(first) < 90 && Math.Abs(second) < 90,
        $"has standard parallels that make no cone; {SaveAgain}");

    private static GridUnit ReadUnit(WktNode unit) => unit.Number(1) is { } metres && GridUnit.OfLength(metres) is { } known
        ? known
        : throw new RefusedDefinitionException(
            $"has the unit '{unit.Name}', which was not checked; known are metres, feet and US survey feet");

    private static void CheckAxes(WktNode root)
    {
        string[] directions = [.. root.Of("AXIS").Select(axis => axis.Values.LastOrDefault(string.Empty).ToUpperInvariant())];
        Require(
            directions is [] or ["EAST", "NORTH"],
            $"has its axes toward {string.Join(" and ", directions)}, which was not checked; use a system of easting and northing");
    }

    private static void CheckParts(WktNode node, params string[] known)
    {
        WktNode? other = node.Nodes.FirstOrDefault(inner => !known.Contains(inner.Keyword));
        Require(
            other is null,
            $"has the part {other?.Keyword} in {node.Keyword}, which was not checked; "
            + "use the definition without it if the system is the same");
    }

    private static WktNode Only(WktNode node, string keyword) => node.Of(keyword).ToArray() is [{ } one]
        ? one
        : throw new RefusedDefinitionException($"must have one {keyword} in {node.Keyword}; {SaveAgain}");

    private static bool Names(ProjectionParameterName parameter, WktNode node) =>
        Plain(node.Name) == Plain(parameter.WktName) || Plain(node.Name) == Plain(parameter.EsriName);

    private static string Plain(string name) => name.Replace("_", string.Empty, StringComparison.Ordinal).ToUpperInvariant();

    private static bool Near(double? value, double expected) => value is { } given && Math.Abs(given / expected - 1) < PrintTolerance;

    private static void Require(bool holds, string problem)
    {
        if (!holds)
        {
            throw new RefusedDefinitionException(problem);
        }
    }
}
