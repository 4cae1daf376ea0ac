using System.Numerics;
using CaptureZone.Aquifers;
using CaptureZone.Elements;
using CaptureZone.Elements.Regional;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;

namespace CaptureZone.Tests.Flow;

/// <summary>Short ways to a field.</summary>
public static class Superposed
{
    /// <summary>Confined, 12 m thick, the head well above its top.</summary>
    public static Aquifer Confined { get; } = new(Conductivity: 18, Base: 212, Top: 224, Porosity: 0.24);

    /// <summary>Flow toward the east-south-east.</summary>
    public static RegionalFlow Regional { get; } = new(Gradient: 0.0031, Direction: -0.4, Head: 231.6, HeadAt: new Complex(-3000, 1000));

    public static FlowField Field(Aquifer aquifer, RegionalFlow regional, params Element[] elements) =>
        FlowSystem.Assemble(new Model(aquifer, regional, [.. elements])).Solve();

    public static Well Well(double x, double y, double rate, double radius = 0.15) =>
        new(string.Create(System.Globalization.CultureInfo.InvariantCulture, $"W {x} {y}"), new Complex(x, y), rate, radius, WellPurpose.Other);

    /// <summary>Wells anywhere in a square of 1 km; one in four injects.</summary>
    public static Well[] Wells(int count, int seed)
    {
        Random random = new(seed);
        return
        [
            .. Enumerable.Range(0, count).Select(_ => Well(
                1000 * random.NextDouble() - 500, 1000 * random.NextDouble() - 500, 200 * random.NextDouble() - 50)),
        ];
    }

    /// <summary>Points anywhere in a square about the origin.</summary>
    public static (double[] X, double[] Y) Places(int count, double halfSide, int seed)
    {
        Random random = new(seed);
        double[] x = new double[count], y = new double[count];
        for (int i = 0; i < count; i++)
        {
            x[i] = halfSide * (2 * random.NextDouble() - 1);
            y[i] = halfSide * (2 * random.NextDouble() - 1);
        }

        return (x, y);
    }
}
