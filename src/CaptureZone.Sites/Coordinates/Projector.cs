using ProjNet.CoordinateSystems;
using ProjNet.CoordinateSystems.Transformations;

namespace CaptureZone.Sites.Coordinates;

/// <summary>
/// The projection of a definition, both ways, between longitude and latitude on the definition's own datum and plane coordinates in
/// its own unit. Set up at its first use and once; may be used from many threads.
/// </summary>
/// <param name="definition">The definition.</param>
/// <remarks>
/// The datum is taken as itself: going through WGS 84 and geocentric coordinates would cost some millimetres on every way and gain
/// nothing, for the checked datums have no shift that is agreed upon.
/// </remarks>
public sealed class Projector(ProjectedDefinition definition)
{
    private readonly Lazy<(MathTransform Forward, MathTransform Back)> _transforms = new(() => Transforms(definition));

    /// <summary>Plane coordinates of a place, in the definition's unit.</summary>
    /// <param name="longitude">Degrees.</param>
    /// <param name="latitude">Degrees.</param>
    public (double X, double Y) FromLonLat(double longitude, double latitude) => _transforms.Value.Forward.Transform(longitude, latitude);

    /// <summary>Longitude and latitude of a place, degrees.</summary>
    /// <param name="x">Easting, in the definition's unit.</param>
    /// <param name="y">Northing, in the definition's unit.</param>
    public (double Longitude, double Latitude) ToLonLat(double x, double y) => _transforms.Value.Back.Transform(x, y);

    private static (MathTransform Forward, MathTransform Back) Transforms(ProjectedDefinition definition)
    {
        var make = new CoordinateSystemFactory();
        Ellipsoid shape = definition.Datum.Ellipsoid;
        ProjNet.CoordinateSystems.Ellipsoid ellipsoid = make.CreateFlattenedSphere(
            shape.Name, shape.SemiMajorAxis, shape.InverseFlattening, LinearUnit.Metre);
        HorizontalDatum datum = make.CreateHorizontalDatum(definition.Datum.WktName, DatumType.HD_Geocentric, ellipsoid, null);
        GeographicCoordinateSystem geographic = make.CreateGeographicCoordinateSystem(
            definition.Datum.Name,
            AngularUnit.Degrees,
            datum,
            PrimeMeridian.Greenwich,
            new AxisInfo("Lon", AxisOrientationEnum.East),
            new AxisInfo("Lat", AxisOrientationEnum.North));
        List<ProjectionParameter> parameters =
            [.. definition.Method.Parameters.Select((parameter, i) => new ProjectionParameter(parameter.WktName, definition.Values[i]))];
        ProjectedCoordinateSystem projected = make.CreateProjectedCoordinateSystem(
            definition.Name,
            geographic,
            make.CreateProjection(definition.Method.WktName, definition.Method.WktName, parameters),
            Linear(definition.Unit),
            new AxisInfo("Easting", AxisOrientationEnum.East),
            new AxisInfo("Northing", AxisOrientationEnum.North));
        var between = new CoordinateTransformationFactory();
        return (
            between.CreateFromCoordinateSystems(geographic, projected).MathTransform,
            between.CreateFromCoordinateSystems(projected, geographic).MathTransform);
    }

    private static LinearUnit Linear(GridUnit unit) =>
        new(unit.Metres, unit.WktName, "EPSG", unit.Epsg, string.Empty, string.Empty, string.Empty);
}
