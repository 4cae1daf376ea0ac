using System.Collections.Immutable;

namespace CaptureZone.Sites.Coordinates;

/// <summary>What a parameter of a projection is, which fixes its unit.</summary>
public enum ParameterKind
{
    /// <summary>A latitude, degrees.</summary>
    Latitude,

    /// <summary>A longitude, degrees.</summary>
    Longitude,

    /// <summary>Scale along the central meridian.</summary>
    Scale,

    /// <summary>A false easting or northing, in the system's unit.</summary>
    Offset,
}

/// <summary>One parameter of a projection.</summary>
/// <param name="WktName">Its name in well-known text.</param>
/// <param name="EsriName">Its name in .prj files.</param>
/// <param name="Kind">What it is.</param>
public sealed record ProjectionParameterName(string WktName, string EsriName, ParameterKind Kind);

/// <summary>A projection that was checked against independent values.</summary>
/// <param name="WktName">Its name in well-known text.</param>
/// <param name="EsriName">Its name in .prj files.</param>
/// <param name="Parameters">Its parameters, in the order in which well-known text lists them.</param>
public sealed record ProjectionMethod(string WktName, string EsriName, ImmutableArray<ProjectionParameterName> Parameters)
{
    private static readonly ProjectionParameterName Parallel1 = new("standard_parallel_1", "Standard_Parallel_1", ParameterKind.Latitude);
    private static readonly ProjectionParameterName Parallel2 = new("standard_parallel_2", "Standard_Parallel_2", ParameterKind.Latitude);
    private static readonly ProjectionParameterName FalseEasting = new("false_easting", "False_Easting", ParameterKind.Offset);
    private static readonly ProjectionParameterName FalseNorthing = new("false_northing", "False_Northing", ParameterKind.Offset);
    private static readonly ProjectionParameterName Origin = new("latitude_of_origin", "Latitude_Of_Origin", ParameterKind.Latitude);
    private static readonly ProjectionParameterName Meridian = new("central_meridian", "Central_Meridian", ParameterKind.Longitude);

    /// <summary>Transverse Mercator.</summary>
    public static ProjectionMethod TransverseMercator { get; } = new(
        "Transverse_Mercator",
        "Transverse_Mercator",
        [Origin, Meridian, new("scale_factor", "Scale_Factor", ParameterKind.Scale), FalseEasting, FalseNorthing]);

    /// <summary>Lambert's conformal conic projection with two standard parallels.</summary>
    public static ProjectionMethod LambertTwoParallels { get; } = new(
        "Lambert_Conformal_Conic_2SP",
        "Lambert_Conformal_Conic",
        [Origin, Meridian, Parallel1, Parallel2, FalseEasting, FalseNorthing]);

    /// <summary>Albers' equal-area conic projection.</summary>
    public static ProjectionMethod Albers { get; } = new(
        "Albers_Conic_Equal_Area",
        "Albers",
        [
            Origin with { WktName = "latitude_of_center" },
            Meridian with { WktName = "longitude_of_center" },
            Parallel1,
            Parallel2,
            FalseEasting,
            FalseNorthing,
        ]);

    /// <summary>The projections that were checked.</summary>
    public static ImmutableArray<ProjectionMethod> Checked { get; } = [TransverseMercator, LambertTwoParallels, Albers];

    /// <summary>The checked projection of a name as definitions write it; null when there is none.</summary>
    /// <param name="name">Such as "Lambert_Conformal_Conic_2SP" or "Albers".</param>
    public static ProjectionMethod? Find(string name) => Checked.FirstOrDefault(
        method => name.Equals(method.WktName, StringComparison.OrdinalIgnoreCase)
            || name.Equals(method.EsriName, StringComparison.OrdinalIgnoreCase));
}
