using CaptureZone.Flow;

namespace CaptureZone.Elements.Wells;

/// <summary>Sums over wells without vectors, for machines that have none of 256 bits. Symbols as in <see cref="WellsAtOnePoint"/>.</summary>
internal static class ScalarWells
{
    /// <summary>Adds what the wells contribute at a point.</summary>
    public static void Add(WellPlaces wells, double x, double y, Ask ask, ReadOnlySpan<double> strength, ref PointFlow into)
    {
        if ((ask & Ask.Potential) != 0)
        {
            into.Potential += Potential(wells, x, y, strength);
        }

        if ((ask & (Ask.Discharge | Ask.Gradient)) != 0)
        {
            AddDerivatives(wells, x, y, ask, strength, ref into);
        }
    }

    private static double Potential(WellPlaces wells, double x, double y, ReadOnlySpan<double> strength)
    {
        Span<double> sum = stackalloc double[WellPlaces.Lanes];
        sum.Clear();
        for (int j = 0; j < strength.Length; j++)
        {
            if (strength[j] != 0)
            {
                double dx = x - wells.X[j], dy = y - wells.Y[j];
                sum[j % WellPlaces.Lanes] += strength[j] * Math.Log(dx * dx + dy * dy);
            }
        }

        return Total(sum) * WellPlaces.OneOverFourPi;
    }

    private static void AddDerivatives(
        WellPlaces wells, double x, double y, Ask ask, ReadOnlySpan<double> strength, ref PointFlow into)
    {
        Span<double> sums = stackalloc double[4 * WellPlaces.Lanes];
        sums.Clear();
        Span<double> sumX = sums[..4], sumY = sums[4..8], sumXX = sums[8..12], sumXY = sums[12..];
        for (int j = 0; j < strength.Length; j++)
        {
            double dx = x - wells.X[j], dy = y - wells.Y[j];
            double reciprocal = 1 / Math.Max(dx * dx + dy * dy, WellPlaces.OnAxis);
            double u = strength[j] * reciprocal, ux = u * dx, uy = u * dy;
            int k = j % WellPlaces.Lanes;
            sumX[k] += ux;
            sumY[k] += uy;
            sumXX[k] += (ux * dx - uy * dy) * reciprocal;
            sumXY[k] += ux * dy * reciprocal;
        }

        if ((ask & Ask.Discharge) != 0)
        {
            into.Qx -= Total(sumX) * WellPlaces.OneOverTwoPi;
            into.Qy -= Total(sumY) * WellPlaces.OneOverTwoPi;
        }

        if ((ask & Ask.Gradient) != 0)
        {
            double qxx = Total(sumXX) * WellPlaces.OneOverTwoPi;
            into.Qxx += qxx;
            into.Qxy += Total(sumXY) * (2 * WellPlaces.OneOverTwoPi);
            into.Qyy -= qxx;
        }
    }

    private static double Total(ReadOnlySpan<double> sums) => (sums[0] + sums[1]) + (sums[2] + sums[3]);
}
