namespace CaptureZone.Sites.Coordinates;

/// <summary>The coordinate system of a site: local, or a projected system that was checked.</summary>
public abstract record CoordinateSystem
{
    /// <summary>As the site file states it: "EPSG:26914", "local m", or the name of a .prj or .wkt file.</summary>
    public required string Stated { get; init; }

    /// <summary>Its name in words, such as "NAD83 / UTM zone 14N".</summary>
    public required string Name { get; init; }

    /// <summary>Its unit as it is printed: "m", "ft", "ftUS".</summary>
    public required string Unit { get; init; }

    /// <summary>Length of its unit, m.</summary>
    public required double MetresPerUnit { get; init; }

    /// <summary>EPSG code; null when it has none that is known.</summary>
    public required int? Epsg { get; init; }

    /// <summary>Whether coordinates are local, tied to no place on earth.</summary>
    public abstract bool IsLocal { get; }

    /// <summary>Its definition as well-known text for GIS files (WKT1); empty for local coordinates.</summary>
    public required string Wkt { get; init; }

    /// <summary>Its definition in the form that Shapefiles' .prj files use; empty for local coordinates.</summary>
    public required string PrjText { get; init; }

    /// <summary>Longitude and latitude, degrees, of a place in the site's coordinates.</summary>
    /// <param name="x">Easting, in the site's unit.</param>
    /// <param name="y">Northing, in the site's unit.</param>
    /// <exception cref="InvalidOperationException">The coordinates are local.</exception>
    public abstract (double Longitude, double Latitude) ToLonLat(double x, double y);

    /// <summary>What is wrong with a place in the site's coordinates, in one line; null when nothing is.</summary>
    /// <param name="x">Easting, in the site's unit.</param>
    /// <param name="y">Northing, in the site's unit.</param>
    public virtual string? ProblemWith(double x, double y) => null;
}
