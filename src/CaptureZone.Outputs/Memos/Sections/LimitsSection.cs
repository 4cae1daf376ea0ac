namespace CaptureZone.Outputs.Memos.Sections;

/// <summary>What the method cannot show.</summary>
internal static class LimitsSection
{
    public static IEnumerable<Block> Of() =>
    [
        new Heading(1, "Limits of the method"),
        new Bullets(
        [
            "Screening level: the result is as good as conductivity, gradient and flow direction, which are rarely known better than "
                + "within a factor. A prediction for one set of inputs says nothing of how likely it is.",
            "Two-dimensional: water above or below the screened interval, and contaminants that sink or rise, are not seen.",
            "Steady state: the zones are those after the heads have settled under constant pumping. Before that, and when pumps stop, "
                + "they are smaller or elsewhere.",
            "Homogeneous: channels, lenses and fractures can carry water past the wells or bring it from outside the zones.",
            "Effective porosity enters the travel times in direct proportion and the steady zones not at all.",
            "Margins are distances in the calculation and hold no allowance for uncertain inputs.",
            "Arrival times concern the water that is in the plume now; contaminants that desorb or diffuse later come after it.",
        ]),
    ];
}
