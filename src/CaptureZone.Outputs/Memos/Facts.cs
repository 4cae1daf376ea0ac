using System.Collections.Immutable;
using CaptureZone.Aquifers;
using CaptureZone.Elements.Wells;
using CaptureZone.Outputs.Text;
using CaptureZone.Sites;
using CaptureZone.Zones;

namespace CaptureZone.Outputs.Memos;

/// <summary>What several sections of the memo speak of.</summary>
/// <param name="report">The report.</param>
internal sealed class Facts(Report report)
{
    public const string NotGiven = "not given";

    /// <summary>The report itself.</summary>
    public Report Report => report;

    /// <summary>The site as understood.</summary>
    public SiteDocument Site => report.Site;

    /// <summary>What the engine found.</summary>
    public SiteAnswers Answers => report.Answers;

    /// <summary>The aquifer.</summary>
    public Aquifer Aquifer => Site.Model.Aquifer;

    /// <summary>Prints in the report's units.</summary>
    public Printer Print { get; } = new(report.Site.Report.Units);

    /// <summary>The wells, in the model's order.</summary>
    public ImmutableArray<Well> Wells { get; } = report.Site.Model.Wells;

    /// <summary>Wells that contain plumes by pumping.</summary>
    public ImmutableArray<Well> Containment { get; } =
        [.. report.Site.Model.Wells.Where(well => well is { Rate: > 0, Purpose: WellPurpose.Containment })];

    /// <summary>Plumes with their answers.</summary>
    public IEnumerable<(Plume Plume, PlumeAnswer Answer)> Plumes =>
        Answers.Plumes.Select(answer => (Answers.Questions.Plumes[answer.Plume], answer));

    /// <summary>Extraction wells with their answers and zones.</summary>
    public IEnumerable<(Well Well, WellAnswer Answer, WellZone Zone)> Zones =>
        from answer in Answers.Wells
        where answer.Zone is not null
        select (Wells[answer.Well], answer, answer.Zone);

    /// <summary>Saturated thickness where the head is known, m: the thickness of hand formulas.</summary>
    public double Thickness => Aquifer.SaturatedThickness(Aquifer.PotentialOf(Site.Model.Regional.Head));

    /// <summary>Regional discharge per unit width T i, m2/d; 0 without regional flow.</summary>
    public double DischargePerWidth => Site.Model.Regional.Discharge(Aquifer).Magnitude;

    /// <summary>A column of numbers whose unit stands in the header.</summary>
    /// <param name="header">The header without the unit.</param>
    /// <param name="kind">What stands in it.</param>
    /// <param name="width">Its width beside the others'.</param>
    public Column NumberColumn(string header, QuantityKind kind, double width) =>
        new($"{header}, {Print.Unit(kind)}", width, IsNumeric: true);

    /// <summary>Names in a row.</summary>
    /// <param name="names">The names.</param>
    public static string Names(IEnumerable<string> names) => string.Join(", ", names);

    /// <summary>The text, or that it was not given.</summary>
    /// <param name="text">A text; empty when not given.</param>
    public static string OrNotGiven(string text) => text.Length == 0 ? NotGiven : text;
}
