using System.Numerics;
using CaptureZone.Topology;
using NetTopologySuite.Simplify;

namespace CaptureZone.Zones;

/// <summary>A line through vertices, for the nearest place on it.</summary>
/// <param name="vertices">Its vertices, m.</param>
internal sealed class Polyline(Complex[] vertices)
{
    /// <summary>The nearest place on a line.</summary>
    /// <param name="Distance">Distance to it, m.</param>
    /// <param name="Segment">Index of the first vertex of the piece on which it lies.</param>
    /// <param name="Nearest">The place, m.</param>
    internal readonly record struct Foot(double Distance, int Segment, Complex Nearest);

    /// <summary>The vertices of a dividing streamline, thinned out.</summary>
    /// <param name="branch">The streamline.</param>
    /// <param name="tolerance">Distance by which they may miss it, m.</param>
    internal static IEnumerable<Complex> Thinned(DividingBranch branch, double tolerance) =>
        DouglasPeuckerLineSimplifier
            .Simplify([.. branch.Points.Select(point => GeometryKit.ToCoordinate(point.At))], tolerance)
            .Select(GeometryKit.ToComplex);

    /// <summary>The place on the line that is nearest to a point.</summary>
    /// <param name="at">The point, m.</param>
    internal Foot FootOf(Complex at)
    {
        Foot best = new(0, 0, vertices[0]);
        double bestSquare = double.PositiveInfinity;
        for (int i = 1; i < vertices.Length; i++)
        {
            Complex a = vertices[i - 1], along = vertices[i] - a, to = at - a;
            double square = along.Real * along.Real + along.Imaginary * along.Imaginary;
            double share = square > 0 ? Math.Clamp((to.Real * along.Real + to.Imaginary * along.Imaginary) / square, 0, 1) : 0;
            double dx = to.Real - share * along.Real, dy = to.Imaginary - share * along.Imaginary;
            double distance = dx * dx + dy * dy;
            if (distance < bestSquare)
            {
                bestSquare = distance;
                best = new Foot(0, i - 1, a + share * along);
            }
        }

        return best with { Distance = Math.Sqrt(bestSquare) };
    }

    /// <summary>The vertices between two feet, in the order from the first to the second.</summary>
    /// <param name="from">The first.</param>
    /// <param name="to">The second.</param>
    internal IEnumerable<Complex> Between(Foot from, Foot to)
    {
        for (int i = from.Segment + 1; i <= to.Segment; i++)
        {
            yield return vertices[i];
        }

        for (int i = from.Segment; i > to.Segment; i--)
        {
            yield return vertices[i];
        }
    }
}
