namespace CaptureZone.Flow;

/// <summary>An interval of 1, 2 or 5 times a power of ten.</summary>
/// <param name="Mantissa">1, 2 or 5.</param>
/// <param name="Exponent">The power of ten.</param>
internal readonly record struct RoundInterval(int Mantissa, int Exponent)
{
    /// <summary>The interval.</summary>
    public double Value => Times(1);

    /// <summary>The round interval whose ratio to a wanted one is nearest to one.</summary>
    /// <param name="wanted">The wanted interval; positive.</param>
    public static RoundInterval Closest(double wanted)
    {
        int decade = (int)Math.Floor(Math.Log10(wanted));
        RoundInterval[] candidates = [new(1, decade), new(2, decade), new(5, decade), new(1, decade + 1)];
        return candidates.MinBy(candidate => Math.Abs(Math.Log(candidate.Value / wanted)));
    }

    /// <summary>Its multiples from a value to another, both included.</summary>
    /// <param name="low">The lowest.</param>
    /// <param name="high">The highest.</param>
    public IEnumerable<double> Multiples(double low, double high)
    {
        for (double k = Math.Ceiling(low / Value); Times(k) <= high; k++)
        {
            yield return Times(k);
        }
    }

    /// <summary>Divides by a power of ten where it can, so that 3 x 0.1 is the double nearest to 0.3.</summary>
    private double Times(double count) =>
        Exponent < 0 ? count * Mantissa / Math.Pow(10, -Exponent) : count * Mantissa * Math.Pow(10, Exponent);
}
