using System.Globalization;

namespace CaptureZone.Sites.Coordinates;

/// <summary>A projected system that was checked: a UTM zone by its code, or a definition from a file.</summary>
public sealed record ProjectedSystem : CoordinateSystem
{
    /// <summary>
    /// Plane coordinates that come back from longitude and latitude farther away than this, m, lie where the projection does not hold.
    /// </summary>
    private const double RoundTripTolerance = 0.01;

    /// <summary>
    /// Eastings of a UTM zone reach from here, m ... (at the equator a zone's edges lie at 166 and 834 km: a quarter of a zone is
    /// allowed beyond each.)
    /// </summary>
    private const double UtmSmallestEasting = 0;

    /// <summary>... to here, m.</summary>
    private const double UtmLargestEasting = 1_000_000;

    /// <summary>Northings of a UTM zone reach from 0 to the false northing of the south, m; 84 degrees north is 9 329 km.</summary>
    private const double UtmLargestNorthing = 10_000_000;

    /// <summary>
    /// A false origin farther from zero than this, in any unit, shows that coordinates the size of degrees are degrees.
    /// </summary>
    private const double FarFalseOrigin = 10_000;

    private ProjectedSystem(ProjectedDefinition definition)
    {
        Definition = definition;
        Projector = new Projector(definition);
    }

    /// <summary>What the system is made of.</summary>
    public ProjectedDefinition Definition { get; }

    /// <inheritdoc/>
    public override bool IsLocal => false;

    private Projector Projector { get; }

    /// <inheritdoc/>
    public override (double Longitude, double Latitude) ToLonLat(double x, double y) => Projector.ToLonLat(x, y);

    /// <summary>Site coordinates of a place, in the site's unit.</summary>
    /// <param name="longitude">Degrees, on the system's own datum.</param>
    /// <param name="latitude">Degrees, on the system's own datum.</param>
    public (double X, double Y) FromLonLat(double longitude, double latitude) => Projector.FromLonLat(longitude, latitude);

    /// <inheritdoc/>
    public override string? ProblemWith(double x, double y)
    {
        string place = string.Create(CultureInfo.InvariantCulture, $"({x}, {y})");
        if (LooksLikeLonLat(x, y))
        {
            string zone = CoordinateSystems.UtmSuggestion(x, y) is { } utm ? $", such as {utm}" : string.Empty;
            return $"{place} looks like longitude and latitude; {Name} takes eastings and northings in {Unit}: "
                + $"project the site's coordinates to a plane system{zone}";
        }

        if (Epsg is not null && !IsNearUtmZone(x, y))
        {
            return $"{place} is far outside {Name}, where eastings are 0 to 1000000 m and northings 0 to 10000000 m; "
                + "check the order (easting, northing) and the zone";
        }

        return ComesBack(x, y)
            ? null
            : $"{place} is outside the area where {Name} can be used; "
                + $"check the coordinates, their order (easting, northing) and their unit ({Unit})";
    }

    /// <summary>Systems are the same when everything that they state is.</summary>
    /// <param name="other">The other.</param>
    public bool Equals(ProjectedSystem? other) => base.Equals(other);

    /// <inheritdoc/>
    public override int GetHashCode() => base.GetHashCode();

    /// <summary>A UTM zone.</summary>
    internal static ProjectedSystem Of(string stated, UtmZone zone)
    {
        ProjectedDefinition definition = zone.Definition;
        return new ProjectedSystem(definition)
        {
            Stated = stated,
            Name = definition.Name,
            Unit = definition.Unit.Symbol,
            MetresPerUnit = definition.Unit.Metres,
            Epsg = zone.Epsg,
            Wkt = WktWriter.Wkt1(definition, zone.Epsg),
            PrjText = WktWriter.Esri(definition, zone.EsriName),
        };
    }

    /// <summary>A system from the text of a file, which stands in outputs as it was given, in the form that it has.</summary>
    internal static ProjectedSystem Of(string stated, ProjectedDefinition definition, string text)
    {
        UtmZone? zone = UtmZone.Matching(definition);
        bool isEsri = DefinitionReader.IsEsri(text);
        return new ProjectedSystem(definition)
        {
            Stated = stated,
            Name = zone?.Definition.Name ?? definition.Name,
            Unit = definition.Unit.Symbol,
            MetresPerUnit = definition.Unit.Metres,
            Epsg = zone?.Epsg,
            Wkt = isEsri ? WktWriter.Wkt1(zone?.Definition ?? definition, zone?.Epsg) : text,
            PrjText = isEsri ? text : WktWriter.Esri(definition, zone?.EsriName ?? WktWriter.Underscored(definition.Name)),
        };
    }

    private static bool IsNearUtmZone(double x, double y) =>
        x is >= UtmSmallestEasting and <= UtmLargestEasting && y is >= 0 and <= UtmLargestNorthing;

    private bool LooksLikeLonLat(double x, double y) =>
        Math.Abs(x) <= 180 && Math.Abs(y) <= 90 && Definition["false_easting"] + Definition["false_northing"] > FarFalseOrigin;

    private bool ComesBack(double x, double y)
    {
        (double longitude, double latitude) = ToLonLat(x, y);
        (double backX, double backY) = FromLonLat(longitude, latitude);
        return Math.Max(Math.Abs(backX - x), Math.Abs(backY - y)) * MetresPerUnit < RoundTripTolerance;
    }
}
