using System.Numerics;

namespace CaptureZone.Flow;

/// <summary>
/// One condition that the unknown strengths must meet. Geometry is fixed at assembly; parameters (conductivity, rates, stages)
/// enter here as coefficients, so that a field is solved anew without assembling anew.
/// </summary>
public interface IEquation
{
    /// <summary>Where the condition holds, m.</summary>
    Complex At { get; }

    /// <summary>Which limit is meant there.</summary>
    Side Side { get; }

    /// <summary>What of the flow the condition needs.</summary>
    Ask Needs { get; }

    /// <summary>Writes the condition as one row: sum over unknowns of row[k] x strength[k] = right-hand side.</summary>
    /// <param name="parameters">What the field is solved for.</param>
    /// <param name="unknowns">Influence of every unknown at the place, per unit strength.</param>
    /// <param name="known">The flow of all known strengths at the place.</param>
    /// <param name="row">One coefficient per unknown; comes in as zeros.</param>
    /// <param name="rhs">The right-hand side.</param>
    void Row(Parameters parameters, InfluenceRows unknowns, in FlowAt known, Span<double> row, out double rhs);
}

/// <summary>Influence of every unknown at one place, per unit strength. Rows that were not asked for are empty.</summary>
public readonly ref struct InfluenceRows
{
    /// <summary>Of the potential.</summary>
    public ReadOnlySpan<double> Potential { get; init; }

    /// <summary>Of the discharge's east component.</summary>
    public ReadOnlySpan<double> Qx { get; init; }

    /// <summary>Of the discharge's north component.</summary>
    public ReadOnlySpan<double> Qy { get; init; }
}

/// <summary>The flow at one place.</summary>
/// <param name="Potential">Discharge potential, m3/d.</param>
/// <param name="Discharge">Discharge vector Qx + i Qy, m2/d.</param>
public readonly record struct FlowAt(double Potential, Complex Discharge);
