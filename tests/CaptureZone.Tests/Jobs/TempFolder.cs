namespace CaptureZone.Tests.Jobs;

/// <summary>A folder that is gone when the test ends.</summary>
public sealed class TempFolder : IDisposable
{
    public TempFolder() => FullPath = Directory.CreateTempSubdirectory("capturezone-test-").FullName;

    public string FullPath { get; }

    /// <summary>Everything in the folder, at any depth, with '/' between parts.</summary>
    public string[] Entries =>
    [
        .. Directory.EnumerateFileSystemEntries(FullPath, "*", SearchOption.AllDirectories)
            .Select(path => Path.GetRelativePath(FullPath, path).Replace('\\', '/'))
            .Order(StringComparer.Ordinal),
    ];

    public string this[string name] => Path.Combine(FullPath, name);

    public string Write(string name, string text)
    {
        File.WriteAllText(this[name], text);
        return this[name];
    }

    public string Read(string name) => File.ReadAllText(this[name]);

    public void Dispose() => Directory.Delete(FullPath, recursive: true);
}
