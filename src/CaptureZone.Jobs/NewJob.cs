using System.Text;
using CaptureZone.Jobs.Files;
using CaptureZone.Sites.Reading;

namespace CaptureZone.Jobs;

/// <summary>Begins a site: a commented site file that runs as it stands.</summary>
public static class NewJob
{
    /// <summary>The site file's text.</summary>
    /// <param name="us">Whether in US customary units.</param>
    public static string Text(bool us) => NewSite.Text(us);

    /// <summary>Writes the site file; never over another file.</summary>
    /// <param name="path">Its place.</param>
    /// <param name="us">Whether in US customary units.</param>
    /// <exception cref="AccessException">A file stands there, or the place cannot be written.</exception>
    public static void Write(string path, bool us) =>
        WholeFile.Write(path, replace: false, stream => stream.Write(Encoding.UTF8.GetBytes(Text(us))));
}
