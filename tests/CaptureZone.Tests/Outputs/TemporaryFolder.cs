namespace CaptureZone.Tests.Outputs;

/// <summary>A folder that lasts as long as a test.</summary>
public sealed class TemporaryFolder : IDisposable
{
    public string Path { get; } = Directory.CreateTempSubdirectory("capturezone-test-").FullName;

    public string this[string file] => System.IO.Path.Combine(Path, file);

    public void Dispose() => Directory.Delete(Path, recursive: true);
}
