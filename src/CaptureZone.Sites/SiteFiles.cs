using System.Diagnostics.CodeAnalysis;

namespace CaptureZone.Sites;

/// <summary>Reads the files that a site file names.</summary>
public interface ISiteFiles
{
    /// <summary>Reads one file.</summary>
    /// <param name="name">Its name as the site file writes it, relative to the site file's folder.</param>
    /// <param name="bytes">Its content.</param>
    /// <param name="problem">Why it could not be read, in words that follow its name.</param>
    /// <returns>Whether it was read.</returns>
    bool TryRead(string name, [NotNullWhen(true)] out byte[]? bytes, [NotNullWhen(false)] out string? problem);
}

/// <summary>Files on disk, found from a folder.</summary>
/// <param name="folder">The folder of the site file.</param>
public sealed class DiskFiles(string folder) : ISiteFiles
{
    /// <summary>Larger files are no outlines: 64 MiB.</summary>
    private const long LargestFile = 64L << 20;

    /// <inheritdoc/>
    public bool TryRead(string name, [NotNullWhen(true)] out byte[]? bytes, [NotNullWhen(false)] out string? problem)
    {
        bytes = null;
        problem = null;
        try
        {
            FileInfo file = new(Path.Combine(folder, name));
            if (file is { Exists: true, Length: > LargestFile })
            {
                problem = "is larger than 64 MiB";
                return false;
            }

            bytes = File.ReadAllBytes(file.FullName);
            return true;
        }
        catch (Exception failure) when (failure is FileNotFoundException or DirectoryNotFoundException)
        {
            problem = "is not there (looked for from the site file's folder)";
        }
        catch (Exception failure) when (failure is IOException or UnauthorizedAccessException or ArgumentException or NotSupportedException)
        {
            problem = Directory.Exists(Path.Combine(folder, name)) ? "is a folder" : "cannot be read";
        }

        return false;
    }
}

/// <summary>No files: for texts that come from nowhere.</summary>
public sealed class NoFiles : ISiteFiles
{
    /// <inheritdoc/>
    public bool TryRead(string name, [NotNullWhen(true)] out byte[]? bytes, [NotNullWhen(false)] out string? problem)
    {
        bytes = null;
        problem = "cannot be read here: the site file must stand alone";
        return false;
    }
}
