namespace CaptureZone.Tests.Outputs;

/// <summary>Files of this repository, found from where the tests run.</summary>
public static class RepositoryFiles
{
    public static string Read(string relative) => File.ReadAllText(Path.Combine(Root(), relative));

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
