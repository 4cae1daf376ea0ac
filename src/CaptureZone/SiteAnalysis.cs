using CaptureZone.Flow;

namespace CaptureZone;

/// <summary>A step of long work that has begun.</summary>
/// <param name="Name">What is being done.</param>
/// <param name="Fraction">How much of the whole is done, 0 to 1.</param>
public readonly record struct Step(string Name, double Fraction);

/// <summary>Raised when a well takes more than the aquifer yields.</summary>
public sealed class DewateredException : Exception
{
    /// <summary>States which wells are dewatered.</summary>
    /// <param name="wells">Index of each, with the largest rate it could yield with the others held, m3/d (0 when none).</param>
    public DewateredException(IReadOnlyList<(int Well, double LargestRate)> wells)
        : base("Wells take more than the aquifer yields.") => Wells = wells;

    /// <summary>Index of each dewatered well, with the largest rate it could yield with the others held, m3/d.</summary>
    public IReadOnlyList<(int Well, double LargestRate)> Wells { get; }
}

/// <summary>Asks everything of a model in one go: the engine's front door, used by every command.</summary>
public static class SiteAnalysis
{
    /// <summary>Answers the questions.</summary>
    /// <param name="model">The model.</param>
    /// <param name="questions">The questions.</param>
    /// <param name="workers">Who does the work.</param>
    /// <param name="progress">Told of each step; may be null.</param>
    /// <param name="cancel">Stops the work.</param>
    /// <exception cref="DewateredException">A well takes more than the aquifer yields.</exception>
    public static SiteAnswers Run(
        Model model, Questions questions, IWorkers workers, IProgress<Step>? progress, CancellationToken cancel) =>
        throw new NotSupportedException();
}
