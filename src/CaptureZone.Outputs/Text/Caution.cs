namespace CaptureZone.Outputs.Text;

/// <summary>The words that every page and picture bears.</summary>
public static class Caution
{
    /// <summary>The caution in full.</summary>
    public const string Text =
        "Screening level, two-dimensional, steady state. It does not replace the judgement of a licensed hydrogeologist; "
        + "local rules prevail.";

    /// <summary>The caution in parts, for places where lines are short.</summary>
    public static IReadOnlyList<string> Lines { get; } =
    [
        "Screening level, two-dimensional, steady state.",
        "It does not replace the judgement of a licensed hydrogeologist; local rules prevail.",
    ];
}
