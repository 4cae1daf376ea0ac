using System.Numerics;

namespace CaptureZone.Tests.Topology;

/// <summary>A seeded case: wells in uniform flow.</summary>
public sealed record RandomWells(Complex Uniform, Complex[] Places, double[] Rates)
{
    public const int MostWells = 60;

    public double Diameter => Places.Max(a => Places.Max(b => Complex.Abs(a - b)));

    /// <summary>
    /// Wells over a site of 0.1 to 5 km, of 1 to 5 000 m3/d, in uniform flow of 0.01 to 10 m2/d, 1 km from the origin; by the seed
    /// every third has wells clustered within metres, every fourth rates that nearly cancel, every fifth very weak wells.
    /// </summary>
    public static RandomWells Of(int seed)
    {
        Random random = new(seed);
        int count = 1 + seed % MostWells;
        double site = Log(random, 100, 5000);
        Complex middle = new(600, -800);
        Complex[] places = new Complex[count];
        double[] rates = new double[count];
        for (int j = 0; j < count; j++)
        {
            bool clustered = seed % 3 == 0 && j > 0 && random.NextDouble() < 0.5;
            Complex from = clustered ? places[random.Next(j)] : middle;
            places[j] = from + (clustered ? 5 : site) * new Complex(random.NextDouble() - 0.5, random.NextDouble() - 0.5);
            rates[j] = Log(random, 1, 5000) * (random.NextDouble() < 0.3 ? -1 : 1);
            rates[j] *= seed % 5 == 0 && random.NextDouble() < 0.3 ? 1e-6 : 1;
        }

        if (seed % 4 == 0 && count > 1)
        {
            rates[^1] -= rates.Sum() * (1 - Log(random, 1e-12, 1e-2));
        }

        Complex uniform = Complex.FromPolarCoordinates(Log(random, 0.01, 10), 2 * Math.PI * random.NextDouble());
        return new RandomWells(uniform, places, rates);
    }

    private static double Log(Random random, double low, double high) => low * Math.Pow(high / low, random.NextDouble());
}
