using System.Numerics;

namespace CaptureZone.Topology;

/// <summary>
/// The index of a discharge field round a circle: how often its direction turns counter-clockwise on the way round. It is the sum
/// of the indices inside: 1 for every well, minus its multiplicity for every saddle. Sampled, hence a cross-check and no proof.
/// </summary>
public static class Winding
{
    /// <summary>A turn between two samples that is larger than this, rad, is sampled finer.</summary>
    private const double LargestTurn = 0.5;

    /// <summary>Samples to begin with.</summary>
    private const int FirstSamples = 64;

    /// <summary>Halvings of an arc at most: one that needs more all but passes through a stagnation point or a well.</summary>
    private const int MostHalvings = 12;

    /// <summary>The index round a circle.</summary>
    /// <param name="discharge">Discharge vector Qx + i Qy at a place.</param>
    /// <param name="centre">The circle's centre, m.</param>
    /// <param name="radius">Its radius, m.</param>
    public static int Round(Func<Complex, Complex> discharge, Complex centre, double radius)
    {
        double turn = 0, step = 2 * Math.PI / FirstSamples;
        Complex On(double angle) => discharge(centre + Complex.FromPolarCoordinates(radius, angle));
        for (int i = 0; i < FirstSamples; i++)
        {
            turn += Turn(On, i * step, On(i * step), (i + 1) * step, On((i + 1) * step), MostHalvings);
        }

        return (int)Math.Round(turn / (2 * Math.PI));
    }

    private static double Turn(Func<double, Complex> on, double a, Complex atA, double b, Complex atB, int halvings)
    {
        double turn = (atB * Complex.Conjugate(atA)).Phase;
        if (!(Math.Abs(turn) > LargestTurn) || halvings == 0)
        {
            return turn;
        }

        double middle = (a + b) / 2;
        Complex atMiddle = on(middle);
        return Turn(on, a, atA, middle, atMiddle, halvings - 1) + Turn(on, middle, atMiddle, b, atB, halvings - 1);
    }
}
