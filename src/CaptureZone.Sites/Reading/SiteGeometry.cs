using NetTopologySuite;
using NetTopologySuite.Geometries;
using NetTopologySuite.Operation.Valid;

namespace CaptureZone.Sites.Reading;

/// <summary>Shapes from the corners that a file gives.</summary>
internal static class SiteGeometry
{
    /// <summary>Makes all shapes, with the library's robust overlay and relate.</summary>
    public static readonly GeometryFactory Factory = new NtsGeometryServices(GeometryOverlay.NG, GeometryRelate.NG).CreateGeometryFactory();

    /// <summary>The polygon of an outline, either way round, its first corner repeated at the end or not.</summary>
    /// <param name="corners">The corners.</param>
    /// <param name="problem">Why it is none, in words that follow "the outline"; empty when it is.</param>
    public static Polygon? Outline(IReadOnlyList<Coordinate> corners, out string problem)
    {
        int different = corners.Select(corner => (corner.X, corner.Y)).Distinct().Count();
        if (different < 3)
        {
            problem = $"needs at least 3 different corners; found {Words.Number(different)}";
            return null;
        }

        Polygon polygon = Factory.CreatePolygon(Closed(corners));
        problem = ProblemOf(polygon);
        return problem.Length == 0 ? polygon : null;
    }

    /// <summary>Why a polygon cannot be computed with, in words that follow "the outline"; empty when it can.</summary>
    /// <param name="polygon">The polygon.</param>
    public static string ProblemOf(Polygon polygon)
    {
        if (polygon.ConvexHull() is not Polygon)
        {
            return "has no area; its corners lie on one line";
        }

        if (new IsValidOp(polygon).ValidationError is not { } error)
        {
            return "";
        }

        string place = Words.Place(error.Coordinate.X, error.Coordinate.Y);
        return error.ErrorType is TopologyValidationErrors.SelfIntersection or TopologyValidationErrors.RingSelfIntersection
            ? $"crosses or touches itself at {place}; give its corners in the order in which one walks round it"
            : $"is not one area with holes inside it: see {place}";
    }

    private static Coordinate[] Closed(IReadOnlyList<Coordinate> corners) =>
        corners[0].Equals2D(corners[^1]) ? [.. corners] : [.. corners, corners[0].Copy()];
}
