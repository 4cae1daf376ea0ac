namespace CaptureZone.Tests.Outputs;

/// <summary>Files of this repository, found from where the tests run.</summary>
public static class RepositoryFiles
{
    public static string Read(string relative) => File.ReadAllText(Path.Combine(Root(), relative));

    /// <summary>Names of the files in a folder that match a pattern, without their endings, in order.</summary>
    public static IEnumerable<string> Names(string folder, string pattern) =>
        Directory.EnumerateFiles(Path.Combine(Root(), folder), pattern)
            .Select(file => Path.GetFileNameWithoutExtension(file))
            .Order(StringComparer.Ordinal);

    private static string Root()
    {
        DirectoryInfo? folder = new(AppContext.BaseDirectory);
        while (folder is not null && !File.Exists(Path.Combine(folder.FullName, "CaptureZone.sln")))
        {
            folder = folder.Parent;
        }

        return folder?.FullName ?? throw new DirectoryNotFoundException("No folder above the tests holds CaptureZone.sln.");
    }
}
