using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;
using CaptureZone.Flow;

namespace CaptureZone.Elements.Wells;

/// <summary>
/// Sums over wells at one point, a lane a well. Symbols: dx, dy from well to point; r2 = dx2 + dy2; u = q / r2; sums of u dx and u dy
/// are -2 pi Q; sums of (u dx dx - u dy dy) / r2 and u dx dy / r2 are 2 pi Qxx and pi Qxy.
/// </summary>
internal static class WellsAtOnePoint
{
    /// <summary>Adds what the wells contribute at a point.</summary>
    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    public static void Add(in WellPlaces wells, double x, double y, Ask ask, ReadOnlySpan<double> strength, ref PointFlow into)
    {
        if ((ask & Ask.Potential) != 0)
        {
            into.Potential += Potential(wells, x, y, strength);
        }

        if ((ask & Ask.Gradient) != 0)
        {
            AddWithGradient(wells, x, y, ask, strength, ref into);
        }
        else if ((ask & Ask.Discharge) != 0)
        {
            AddDischarge(wells, x, y, strength, ref into);
        }
    }

    private static double Potential(in WellPlaces wells, double x, double y, ReadOnlySpan<double> strength)
    {
        Vector256<double> px = Vector256.Create(x), py = Vector256.Create(y), sum = default;
        for (int j = 0; j < strength.Length; j += WellPlaces.Lanes)
        {
            Vector256<double> dx = px - WellPlaces.Load(wells.X, j), dy = py - WellPlaces.Load(wells.Y, j), q = WellPlaces.LoadStrength(strength, j);
            Vector256<double> term = q * Vector256.Log(dx * dx + dy * dy);
            sum += Vector256.AndNot(term, Vector256.Equals(q, Vector256<double>.Zero));
        }

        return WellPlaces.Total(sum) * WellPlaces.OneOverFourPi;
    }

    private static void AddDischarge(in WellPlaces wells, double x, double y, ReadOnlySpan<double> strength, ref PointFlow into)
    {
        Vector256<double> px = Vector256.Create(x), py = Vector256.Create(y), sumX = default, sumY = default;
        for (int j = 0; j < strength.Length; j += WellPlaces.Lanes)
        {
            Vector256<double> dx = px - WellPlaces.Load(wells.X, j), dy = py - WellPlaces.Load(wells.Y, j);
            Vector256<double> u = WellPlaces.LoadStrength(strength, j) * WellPlaces.Reciprocal(dx * dx + dy * dy);
            sumX += u * dx;
            sumY += u * dy;
        }

        into.Qx -= WellPlaces.Total(sumX) * WellPlaces.OneOverTwoPi;
        into.Qy -= WellPlaces.Total(sumY) * WellPlaces.OneOverTwoPi;
    }

    private static void AddWithGradient(
        WellPlaces wells, double x, double y, Ask ask, ReadOnlySpan<double> strength, ref PointFlow into)
    {
        Vector256<double> px = Vector256.Create(x), py = Vector256.Create(y);
        Vector256<double> sumX = default, sumY = default, sumXX = default, sumXY = default;
        for (int j = 0; j < strength.Length; j += WellPlaces.Lanes)
        {
            Vector256<double> dx = px - WellPlaces.Load(wells.X, j), dy = py - WellPlaces.Load(wells.Y, j);
            Vector256<double> reciprocal = WellPlaces.Reciprocal(dx * dx + dy * dy);
            Vector256<double> u = WellPlaces.LoadStrength(strength, j) * reciprocal, ux = u * dx, uy = u * dy;
            sumX += ux;
            sumY += uy;
            sumXX += (ux * dx - uy * dy) * reciprocal;
            sumXY += ux * dy * reciprocal;
        }

        if ((ask & Ask.Discharge) != 0)
        {
            into.Qx -= WellPlaces.Total(sumX) * WellPlaces.OneOverTwoPi;
            into.Qy -= WellPlaces.Total(sumY) * WellPlaces.OneOverTwoPi;
        }

        double qxx = WellPlaces.Total(sumXX) * WellPlaces.OneOverTwoPi;
        into.Qxx += qxx;
        into.Qxy += WellPlaces.Total(sumXY) * (2 * WellPlaces.OneOverTwoPi);
        into.Qyy -= qxx;
    }
}
