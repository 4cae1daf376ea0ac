using CaptureZone.Elements.Wells;

namespace CaptureZone.Outputs.Text;

/// <summary>Words for wells.</summary>
public static class WellText
{
    /// <summary>The purpose as files write it: <c>containment</c>, <c>supply</c>, <c>other</c>.</summary>
    /// <param name="purpose">The purpose.</param>
    public static string Token(WellPurpose purpose) => purpose switch
    {
        WellPurpose.Containment => "containment",
        WellPurpose.Supply => "supply",
        _ => "other",
    };
}
