using CaptureZone.Flow;

namespace CaptureZone.Elements.Wells;

/// <summary>Gathers all wells of a model into one bank.</summary>
public sealed class WellGathering : IGathering
{
    private readonly List<Well> _wells = [];

    /// <summary>Takes one more well.</summary>
    /// <param name="well">The well.</param>
    public void Add(Well well) => _wells.Add(well);

    /// <inheritdoc/>
    public void Finish(SystemBuilder to) =>
        to.AddKnown(new WellBank(_wells), static (parameters, strength) => parameters.Rates.CopyTo(strength));
}
