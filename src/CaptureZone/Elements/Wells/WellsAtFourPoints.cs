using System.Runtime.CompilerServices;
using System.Runtime.Intrinsics;
using CaptureZone.Flow;
using V = System.Runtime.Intrinsics.Vector256<double>;

namespace CaptureZone.Elements.Wells;

/// <summary>
/// Sums over wells at many points, a lane a point. Symbols as in <see cref="WellsAtOnePoint"/>. Compiled in full at the first call: a
/// command asks for many points but a few times, too few for the loops to be compiled again when they turn out to be busy.
/// </summary>
internal static class WellsAtFourPoints
{
    /// <summary>Adds what the wells contribute at the first points.</summary>
    /// <param name="wells">The wells.</param>
    /// <param name="at">The points.</param>
    /// <param name="count">How many of them; a multiple of four.</param>
    /// <param name="ask">What is wanted.</param>
    /// <param name="strength">Rate of each well, m3/d.</param>
    /// <param name="into">Where it is added.</param>
    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    public static void Add(WellPlaces wells, Points at, int count, Ask ask, ReadOnlySpan<double> strength, in FlowBlock into)
    {
        for (int i = 0; i < count; i += WellPlaces.Lanes)
        {
            V x = Load(at.X, i), y = Load(at.Y, i);
            if ((ask & Ask.Potential) != 0)
            {
                AddTo(into.Potential, i, Potential(wells, x, y, strength));
            }

            if ((ask & Ask.Discharge) != 0)
            {
                Discharge(wells, x, y, strength, out V qx, out V qy);
                AddTo(into.Qx, i, qx);
                AddTo(into.Qy, i, qy);
            }

            if ((ask & Ask.Gradient) != 0)
            {
                Gradient(wells, x, y, strength, out V qxx, out V qxy);
                AddTo(into.Qxx, i, qxx);
                AddTo(into.Qxy, i, qxy);
                AddTo(into.Qyy, i, -qxx);
            }
        }
    }

    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static V Potential(WellPlaces wells, V x, V y, ReadOnlySpan<double> strength)
    {
        V s0 = default, s1 = default, s2 = default, s3 = default;
        for (int j = 0; j < strength.Length; j += WellPlaces.Lanes)
        {
            AddPotential(wells, x, y, j, strength, ref s0);
            AddPotential(wells, x, y, j + 1, strength, ref s1);
            AddPotential(wells, x, y, j + 2, strength, ref s2);
            AddPotential(wells, x, y, j + 3, strength, ref s3);
        }

        return ((s0 + s1) + (s2 + s3)) * WellPlaces.OneOverFourPi;
    }

    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static void Discharge(WellPlaces wells, V x, V y, ReadOnlySpan<double> strength, out V qx, out V qy)
    {
        V x0 = default, x1 = default, x2 = default, x3 = default, y0 = default, y1 = default, y2 = default, y3 = default;
        for (int j = 0; j < strength.Length; j += WellPlaces.Lanes)
        {
            AddDischarge(wells, x, y, j, strength, ref x0, ref y0);
            AddDischarge(wells, x, y, j + 1, strength, ref x1, ref y1);
            AddDischarge(wells, x, y, j + 2, strength, ref x2, ref y2);
            AddDischarge(wells, x, y, j + 3, strength, ref x3, ref y3);
        }

        qx = ((x0 + x1) + (x2 + x3)) * -WellPlaces.OneOverTwoPi;
        qy = ((y0 + y1) + (y2 + y3)) * -WellPlaces.OneOverTwoPi;
    }

    [MethodImpl(MethodImplOptions.AggressiveOptimization)]
    private static void Gradient(WellPlaces wells, V x, V y, ReadOnlySpan<double> strength, out V qxx, out V qxy)
    {
        V x0 = default, x1 = default, x2 = default, x3 = default, y0 = default, y1 = default, y2 = default, y3 = default;
        for (int j = 0; j < strength.Length; j += WellPlaces.Lanes)
        {
            AddGradient(wells, x, y, j, strength, ref x0, ref y0);
            AddGradient(wells, x, y, j + 1, strength, ref x1, ref y1);
            AddGradient(wells, x, y, j + 2, strength, ref x2, ref y2);
            AddGradient(wells, x, y, j + 3, strength, ref x3, ref y3);
        }

        qxx = ((x0 + x1) + (x2 + x3)) * WellPlaces.OneOverTwoPi;
        qxy = ((y0 + y1) + (y2 + y3)) * (2 * WellPlaces.OneOverTwoPi);
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void AddPotential(WellPlaces wells, V x, V y, int j, ReadOnlySpan<double> strength, ref V sum)
    {
        double q = Strength(strength, j);
        if (q != 0)
        {
            V dx = x - Vector256.Create(wells.X[j]), dy = y - Vector256.Create(wells.Y[j]);
            sum += q * Vector256.Log(dx * dx + dy * dy);
        }
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void AddDischarge(WellPlaces wells, V x, V y, int j, ReadOnlySpan<double> strength, ref V sumX, ref V sumY)
    {
        V dx = x - Vector256.Create(wells.X[j]), dy = y - Vector256.Create(wells.Y[j]);
        V u = Strength(strength, j) * WellPlaces.Reciprocal(dx * dx + dy * dy);
        sumX += u * dx;
        sumY += u * dy;
    }

    [MethodImpl(MethodImplOptions.AggressiveInlining)]
    private static void AddGradient(WellPlaces wells, V x, V y, int j, ReadOnlySpan<double> strength, ref V sumXX, ref V sumXY)
    {
        V dx = x - Vector256.Create(wells.X[j]), dy = y - Vector256.Create(wells.Y[j]);
        V reciprocal = WellPlaces.Reciprocal(dx * dx + dy * dy);
        V u = Strength(strength, j) * reciprocal, ux = u * dx, uy = u * dy;
        sumXX += (ux * dx - uy * dy) * reciprocal;
        sumXY += ux * dy * reciprocal;
    }

    /// <summary>A well's strength; zero past the last.</summary>
    private static double Strength(ReadOnlySpan<double> strength, int j) => j < strength.Length ? strength[j] : 0;

    private static V Load(ReadOnlySpan<double> from, int i) => Vector256.Create(from.Slice(i, WellPlaces.Lanes));

    private static void AddTo(Span<double> span, int i, V value) =>
        (Load(span, i) + value).CopyTo(span.Slice(i, WellPlaces.Lanes));
}
