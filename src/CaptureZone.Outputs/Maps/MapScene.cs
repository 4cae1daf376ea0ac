using CaptureZone.Outputs.Text;

namespace CaptureZone.Outputs.Maps;

/// <summary>What every layer draws from.</summary>
/// <param name="Report">Document and answers.</param>
/// <param name="View">Where places lie on the sheet.</param>
internal sealed record MapScene(Report Report, PlanView View)
{
    /// <summary>Prints quantities in the report's units.</summary>
    public Printer Print { get; } = new(Report.Site.Report.Units);

    /// <summary>The answers.</summary>
    public SiteAnswers Answers => Report.Answers;

    /// <summary>The model.</summary>
    public Model Model => Report.Site.Model;
}
