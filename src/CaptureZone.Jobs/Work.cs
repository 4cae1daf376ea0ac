using CaptureZone.Flow;

namespace CaptureZone.Jobs;

/// <summary>How long work is done, who hears of it and what stops it.</summary>
/// <param name="Workers">Who does it.</param>
/// <param name="Progress">Told of each step; may be null.</param>
/// <param name="Cancel">Stops it.</param>
public sealed record Work(IWorkers Workers, IProgress<Step>? Progress, CancellationToken Cancel);
