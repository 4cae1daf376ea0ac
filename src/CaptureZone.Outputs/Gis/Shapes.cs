using System.Collections.Immutable;
using System.Numerics;
using NetTopologySuite.Geometries;

namespace CaptureZone.Outputs.Gis;

/// <summary>Shapes from the engine's plain points.</summary>
internal static class Shapes
{
    public static readonly GeometryFactory Factory = new();

    public static Point Point(Complex at) => Factory.CreatePoint(Coordinate(at));

    public static MultiLineString Lines(IEnumerable<ImmutableArray<Complex>> lines) => Factory.CreateMultiLineString(
        [.. lines.Where(line => line.Length > 1).Select(line => Factory.CreateLineString([.. line.Select(Coordinate)]))]);

    public static Coordinate Coordinate(Complex at) => new(at.Real, at.Imaginary);
}
