using System.Numerics;
using CaptureZone.Flow;

namespace CaptureZone.Elements.Regional;

/// <summary>The head at one place is known, with everything acting.</summary>
/// <param name="At">The place, m.</param>
public sealed record KnownHead(Complex At) : IEquation
{
    /// <inheritdoc/>
    public Side Side => Side.Off;

    /// <inheritdoc/>
    public Ask Needs => Ask.Potential;

    /// <inheritdoc/>
    public void Row(Parameters parameters, InfluenceRows unknowns, in FlowAt known, Span<double> row, out double rhs)
    {
        unknowns.Potential.CopyTo(row);
        rhs = parameters.Aquifer.PotentialOf(parameters.Regional.Head) - known.Potential;
    }
}
