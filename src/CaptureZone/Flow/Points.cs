namespace CaptureZone.Flow;

/// <summary>Many points as structure of arrays, in local metres. Both spans have the same length.</summary>
public readonly ref struct Points
{
    /// <summary>Takes the coordinates as they are, without copying.</summary>
    /// <param name="x">Eastings, m.</param>
    /// <param name="y">Northings, m.</param>
    /// <exception cref="ArgumentException">The lengths differ.</exception>
    public Points(ReadOnlySpan<double> x, ReadOnlySpan<double> y)
    {
        if (x.Length != y.Length)
        {
            throw new ArgumentException("x and y must have the same length.", nameof(y));
        }

        X = x;
        Y = y;
    }

    /// <summary>Eastings, m.</summary>
    public ReadOnlySpan<double> X { get; }

    /// <summary>Northings, m.</summary>
    public ReadOnlySpan<double> Y { get; }

    /// <summary>How many points.</summary>
    public int Count => X.Length;

    /// <summary>A part of the points.</summary>
    /// <param name="start">First index.</param>
    /// <param name="count">How many.</param>
    public Points Slice(int start, int count) => new(X.Slice(start, count), Y.Slice(start, count));
}

/// <summary>Which limit is meant for points that lie on a line with two sides.</summary>
public enum Side
{
    /// <summary>The point lies on no line.</summary>
    Off,

    /// <summary>The limit from the left of the line's direction.</summary>
    Left,

    /// <summary>The limit from the right of the line's direction.</summary>
    Right,
}

/// <summary>What is asked of a field at points; may be combined.</summary>
[Flags]
public enum Ask
{
    /// <summary>The discharge potential, m3/d.</summary>
    Potential = 1,

    /// <summary>The discharge vector, m2/d.</summary>
    Discharge = 2,

    /// <summary>The derivatives of the discharge vector, m/d.</summary>
    Gradient = 4,
}
