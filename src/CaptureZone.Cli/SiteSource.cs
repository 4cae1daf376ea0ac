using CaptureZone.Jobs;
using CaptureZone.Sites;

namespace CaptureZone.Cli;

/// <summary>Finds site files.</summary>
internal static class SiteSource
{
    /// <summary>The content of a site file; the files that it names lie beside it, or in the working folder for standard input.</summary>
    /// <param name="session">The command.</param>
    /// <param name="path">The site file; "-" for standard input.</param>
    /// <exception cref="AccessException">It cannot be read.</exception>
    public static SiteInput Open(Session session, string path) =>
        new(path, session.ReadFile(path), new DiskFiles(FolderOf(path)));

    /// <summary>Reads a site and prints its warnings.</summary>
    /// <param name="session">The command.</param>
    /// <param name="path">The site file; "-" for standard input.</param>
    /// <exception cref="AccessException">It cannot be read.</exception>
    /// <exception cref="InputRefusedException">Something is wrong with it.</exception>
    public static SiteDocument Read(Session session, string path)
    {
        SiteDocument site = Open(session, path).Read();
        session.Complain(site.Warnings);
        return site;
    }

    /// <summary>Where the results of a site go unless another place is named: the file's name and "-results", beside it.</summary>
    /// <param name="path">The site file; "-" for standard input.</param>
    public static string ResultFolder(string path)
    {
        string name = path == Session.StandardStream ? "site" : Path.GetFileNameWithoutExtension(path);
        return Path.Combine(FolderOf(path), name + "-results");
    }

    private static string FolderOf(string path) => path == Session.StandardStream ? "" : Path.GetDirectoryName(path) ?? "";
}
