using CaptureZone.Sites;

namespace CaptureZone.Outputs;

/// <summary>
/// Document and answers: all that any output is written from. A new output takes a report and touches nothing else.
/// </summary>
/// <param name="Site">The site as understood.</param>
/// <param name="Answers">What the engine found.</param>
/// <param name="ProgramVersion">Version of this program.</param>
public sealed record Report(SiteDocument Site, SiteAnswers Answers, string ProgramVersion);
