using CaptureZone.Flow;
using CaptureZone.Jobs.Files;
using CaptureZone.Outputs;
using CaptureZone.Sites;

namespace CaptureZone.Jobs.Runs;

/// <summary>Answers a model's questions.</summary>
/// <param name="model">The model.</param>
/// <param name="questions">The questions.</param>
/// <param name="workers">Who does the work.</param>
/// <param name="progress">Told of each step; may be null.</param>
/// <param name="cancel">Stops the work.</param>
public delegate SiteAnswers Analysis(
    Model model, Questions questions, IWorkers workers, IProgress<Step>? progress, CancellationToken cancel);

/// <summary>What a run is asked to write, and where.</summary>
/// <param name="Folder">The result folder.</param>
/// <param name="Replace">Whether a result folder may be replaced though someone has worked in it.</param>
/// <param name="Shapefiles">Whether Shapefiles are wanted too.</param>
public sealed record RunRequest(string Folder, bool Replace, bool Shapefiles);

/// <summary>The main job: all results of a site into a folder.</summary>
/// <param name="analysis">Answers the questions: the engine's, unless a test stands in for it.</param>
public sealed class RunJob(Analysis analysis)
{
    /// <summary>Of the whole work, what the calculation takes; the rest is writing.</summary>
    private const double CalculationShare = 0.7;

    /// <summary>The job with the engine's analysis.</summary>
    public static RunJob WithEngine() => new(SiteAnalysis.Run);

    /// <summary>Computes everything and writes the folder, whole or not at all.</summary>
    /// <param name="site">The site.</param>
    /// <param name="request">What to write, and where.</param>
    /// <param name="work">How.</param>
    /// <returns>The report that the files were written from.</returns>
    /// <exception cref="InputRefusedException">A well takes more than the aquifer yields.</exception>
    /// <exception cref="AccessException">The folder cannot be written, or holds someone's work.</exception>
    /// <exception cref="OperationCanceledException">The work was stopped; nothing was written.</exception>
    public Report Run(SiteDocument site, RunRequest request, Work work)
    {
        using ResultFolder folder = ResultFolder.Begin(request.Folder, request.Replace, site.FileName);
        Report report = Analyse(site, work);
        Access.Try(request.Folder, () => RunFiles.Write(report, folder.WorkPath, request.Shapefiles, work with
        {
            Progress = PartOf(work.Progress, CalculationShare, 1),
        }));
        work.Cancel.ThrowIfCancellationRequested();
        folder.Complete();
        return report;
    }

    private Report Analyse(SiteDocument site, Work work)
    {
        IProgress<Step>? progress = PartOf(work.Progress, 0, CalculationShare);
        SiteAnswers answers = Dewatering.Refuse(
            site, () => analysis(site.Model, site.Questions, work.Workers, progress, work.Cancel));
        return new Report(site, answers, ProgramVersion.Text);
    }

    private static ProgressPart? PartOf(IProgress<Step>? whole, double from, double to) =>
        whole is null ? null : new ProgressPart(whole, from, to);

    private sealed class ProgressPart(IProgress<Step> whole, double from, double to) : IProgress<Step>
    {
        public void Report(Step value) => whole.Report(value with { Fraction = from + (to - from) * value.Fraction });
    }
}
