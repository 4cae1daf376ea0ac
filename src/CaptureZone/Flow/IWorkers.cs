namespace CaptureZone.Flow;

/// <summary>
/// Who does work that splits into independent parts. Injected, so that the engine starts no thread of its own; results never
/// depend on how many there are.
/// </summary>
public interface IWorkers
{
    /// <summary>Does every part once, in any order, and returns when all are done.</summary>
    /// <param name="count">How many parts.</param>
    /// <param name="body">Does the part with the index given.</param>
    void For(int count, Action<int> body);
}

/// <summary>One worker: the calling thread.</summary>
public sealed class OneWorker : IWorkers
{
    /// <inheritdoc/>
    public void For(int count, Action<int> body)
    {
        for (int i = 0; i < count; i++)
        {
            body(i);
        }
    }
}

/// <summary>The thread pool, up to a number of threads.</summary>
/// <param name="threads">How many at most; at least 1.</param>
public sealed class ThreadWorkers(int threads) : IWorkers
{
    /// <inheritdoc/>
    public void For(int count, Action<int> body) =>
        Parallel.For(0, count, new ParallelOptions { MaxDegreeOfParallelism = threads }, body);
}
