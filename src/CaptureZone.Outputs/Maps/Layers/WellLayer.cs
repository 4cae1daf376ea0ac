using CaptureZone.Elements.Wells;

namespace CaptureZone.Outputs.Maps;

/// <summary>Wells with name and rate, each with the symbol of its purpose.</summary>
/// <param name="scene">What is drawn.</param>
internal sealed class WellLayer(MapScene scene) : IMapLayer
{
    /// <summary>From a well's centre to its label: clear of the symbol's rim, units of the sheet.</summary>
    private const float Clearance = Look.SymbolRadius + 9;

    private static readonly TextStyle NameStyle = new(Look.NameSize, Look.Ink, Bold: true, Halo: true);
    private static readonly TextStyle RateStyle = new(Look.SmallSize, Look.Ink, Halo: true);

    private static readonly (WellSymbol Symbol, string Text)[] Kinds =
    [
        (WellSymbol.Containment, "Containment well with its rate"),
        (WellSymbol.Supply, "Supply well with its rate"),
        (WellSymbol.Other, "Other extraction well with its rate"),
        (WellSymbol.Injection, "Injection well with its rate"),
        (WellSymbol.Idle, "Idle well"),
    ];

    /// <inheritdoc/>
    public string Name => "wells";

    private IEnumerable<Well> Shown => scene.Model.Wells.Where(well => scene.View.Shows(well.At));

    /// <inheritdoc/>
    public IEnumerable<LegendItem> Legend
    {
        get
        {
            HashSet<WellSymbol> shown = [.. Shown.Select(WellSymbols.Of)];
            return Kinds.Where(kind => shown.Contains(kind.Symbol)).Select(kind =>
                new LegendItem(kind.Text, (canvas, area) => WellSymbols.Draw(canvas, kind.Symbol, new(area.MidX, area.MidY))));
        }
    }

    /// <inheritdoc/>
    public IEnumerable<LabelBox> Symbols =>
        Shown.Select(well => new LabelBox(scene.View.At(well.At), Look.SymbolRadius, Look.SymbolRadius, 0));

    /// <inheritdoc/>
    public IEnumerable<LabelRequest> Labels => Shown.Select(well =>
    {
        LabelBlock block = LabelBlock.Of((well.Name, NameStyle), (Rate(well), RateStyle));
        return new LabelRequest(block, LabelSpots.Around(scene.View.At(well.At), Clearance, block));
    });

    /// <inheritdoc/>
    public void Draw(IMapCanvas canvas)
    {
        foreach (Well well in Shown)
        {
            WellSymbols.Draw(canvas, WellSymbols.Of(well), scene.View.At(well.At));
        }
    }

    private string Rate(Well well) => well.Rate switch
    {
        0 => "idle",
        < 0 => $"injects {scene.Print.ShortRate(-well.Rate)}",
        _ => scene.Print.ShortRate(well.Rate),
    };
}
