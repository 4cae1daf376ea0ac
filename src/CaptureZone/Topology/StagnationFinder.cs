using System.Collections.Immutable;
using CaptureZone.Elements.Wells;
using CaptureZone.Flow;

namespace CaptureZone.Topology;

/// <summary>Finds the places where the water stands still.</summary>
public static class StagnationFinder
{
    /// <summary>All stagnation points of a field. Without recharge the potential is harmonic, and each is a saddle.</summary>
    /// <param name="field">The field: wells in uniform flow.</param>
    /// <exception cref="NotSupportedException">The field superposes something else.</exception>
    public static StagnationSet Find(FlowField field)
    {
        if (field.System.Model.Elements.FirstOrDefault(element => element is not Well) is { } other)
        {
            throw new NotSupportedException($"Stagnation points with '{other.Name}' are not wells in uniform flow.");
        }

        RationalZeros zeros = RationalFlow.Of(field).Zeros();
        ImmutableArray<StagnationPoint> points =
        [
            .. zeros.Zeros
                .OrderBy(zero => zero.At.Real)
                .ThenBy(zero => zero.At.Imaginary)
                .Select(zero => new StagnationPoint(zero.At, StagnationKind.Saddle, zero.Multiplicity, field.HeadAt(zero.At))),
        ];
        return new StagnationSet(points, zeros.Complete)
        {
            Expected = zeros.Expected,
            Residual = zeros.Zeros.Select(zero => zero.Residual).DefaultIfEmpty().Max(),
        };
    }
}
