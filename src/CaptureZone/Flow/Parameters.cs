using System.Collections.Immutable;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Regional;

namespace CaptureZone.Flow;

/// <summary>What may change between two fields over one geometry: a draw, a trial rate, a what-if.</summary>
/// <param name="Aquifer">The aquifer.</param>
/// <param name="Regional">Regional flow and the known head.</param>
/// <param name="Rates">Rate of every well in the model's order, m3/d, positive for extraction.</param>
public sealed record Parameters(Aquifer Aquifer, RegionalFlow Regional, ImmutableArray<double> Rates)
{
    /// <summary>The parameters that a model states.</summary>
    /// <param name="model">The model.</param>
    public static Parameters Of(Model model) =>
        new(model.Aquifer, model.Regional, [.. model.Wells.Select(well => well.Rate)]);
}
