namespace CaptureZone.Outputs.Memos.Sections;

/// <summary>How it is computed, and where that is published.</summary>
internal static class MethodSection
{
    public static IEnumerable<Block> Of(Facts facts) =>
    [
        new Heading(1, "Method"),
        new Paragraph(
            "Steady flow is written in the discharge potential, which joins confined and water-table flow where the head meets the "
            + "aquifer's top (Strack 1989; Haitjema 1995). In it, uniform regional flow and wells are exact solutions that add "
            + "(Bear 1979; Strack 1989)."),
        new Paragraph(
            (facts.Answers.StagnationComplete
                ? "Every stagnation point is found. "
                : "Stagnation points are searched for; it is not certain that every one was found. ")
            + "The streamlines that flow into them divide the water of one destination from that of "
            + "another; they bound the capture zones and decide the verdict on a plume, as published for wells in uniform flow "
            + "(Todd 1980; Javandel and Tsang 1986). Water is followed at the ground-water velocity, which is the discharge over the "
            + "saturated thickness and the effective porosity, to give the travel-time zones (Bear and Jacobs 1965 for one well). A "
            + "sorbing contaminant moves at that velocity over its retardation."),
        new Paragraph(
            "The way from this prediction to a judgement of capture in the field, by several lines of evidence, is the one of "
            + "US EPA (2008). The calculated fixed radius of the hand check is the one of US EPA (1987)."),
        new Heading(2, "Sources"),
        new Bullets(
        [
            "Bear, J. (1979): Hydraulics of Groundwater.",
            "Bear, J. and Jacobs, M. (1965): On the movement of water bodies injected into aquifers. Journal of Hydrology 3.",
            "Haitjema, H.M. (1995): Analytic Element Modeling of Groundwater Flow.",
            "Javandel, I. and Tsang, C.-F. (1986): Capture-zone type curves: a tool for aquifer cleanup. Ground Water 24(5).",
            "Strack, O.D.L. (1989): Groundwater Mechanics.",
            "Todd, D.K. (1980): Groundwater Hydrology, 2nd edition.",
            "US EPA (1987): Guidelines for Delineation of Wellhead Protection Areas. EPA 440/6-87-010.",
            "US EPA (2008): A Systematic Approach for Evaluation of Capture Zones at Pump and Treat Systems. EPA/600/R-08/003.",
        ]),
    ];
}
