using CaptureZone.Tracing;

namespace CaptureZone.Outputs.Text;

/// <summary>Names of what paths end at and of what water comes from.</summary>
public static class FateText
{
    /// <summary>The fate as tables and GIS files write it: <c>well:NAME</c>, <c>injection:NAME</c>, <c>far</c>, <c>dry</c> ...</summary>
    /// <param name="fate">The fate.</param>
    /// <param name="model">The model whose features it speaks of.</param>
    /// <exception cref="ArgumentOutOfRangeException">The model has no such feature.</exception>
    public static string Token(Fate fate, Model model) => fate.Kind switch
    {
        FateKind.Well => $"well:{WellName(fate, model)}",
        FateKind.Injection => $"injection:{WellName(fate, model)}",
        FateKind.Far => "far",
        FateKind.Dry => "dry",
        FateKind.Time => "time",
        FateKind.Stagnation => "stagnation",
        FateKind.Summit => "summit",
        _ => throw Unknown(fate),
    };

    /// <summary>Where water goes, in words that follow "to".</summary>
    /// <param name="fate">The fate.</param>
    /// <param name="model">The model whose features it speaks of.</param>
    /// <exception cref="ArgumentOutOfRangeException">The model has no such feature.</exception>
    public static string Destination(Fate fate, Model model) => fate.Kind switch
    {
        FateKind.Well => $"well {WellName(fate, model)}",
        FateKind.Injection => $"injection well {WellName(fate, model)}",
        FateKind.Far => "far downgradient",
        FateKind.Dry => "where the aquifer is dry",
        FateKind.Time => "no end within the time asked",
        FateKind.Stagnation => "a stagnation point",
        FateKind.Summit => "a summit of the head",
        _ => throw Unknown(fate),
    };

    /// <summary>Where water comes from, as a name.</summary>
    /// <param name="fate">The fate of its path followed upstream.</param>
    /// <param name="model">The model whose features it speaks of.</param>
    /// <exception cref="ArgumentOutOfRangeException">The model has no such feature.</exception>
    public static string Source(Fate fate, Model model) => fate.Kind switch
    {
        FateKind.Injection => $"injection well {WellName(fate, model)}",
        FateKind.Well => $"well {WellName(fate, model)}",
        FateKind.Far => "regional flow",
        FateKind.Summit => "recharge",
        FateKind.Dry => "where the aquifer is dry",
        FateKind.Time => "farther than was followed",
        FateKind.Stagnation => "a stagnation point",
        _ => throw Unknown(fate),
    };

    /// <summary>Name of the well at which water ends or begins.</summary>
    /// <param name="fate">A fate at a well.</param>
    /// <param name="model">The model whose features it speaks of.</param>
    /// <exception cref="ArgumentOutOfRangeException">The model has no such well.</exception>
    public static string WellName(Fate fate, Model model)
    {
        var wells = model.Wells;
        return fate.Feature >= 0 && fate.Feature < wells.Length ? wells[fate.Feature].Name : throw Unknown(fate);
    }

    private static ArgumentOutOfRangeException Unknown(Fate fate) =>
        new(nameof(fate), fate, "The model has no such feature.");
}
