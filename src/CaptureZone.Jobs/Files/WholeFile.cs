namespace CaptureZone.Jobs.Files;

/// <summary>Files that appear whole or not at all.</summary>
public static class WholeFile
{
    /// <summary>Writes a file beside its place and moves it there when it is complete.</summary>
    /// <param name="path">Its place.</param>
    /// <param name="replace">Whether a file that stands there may be replaced.</param>
    /// <param name="write">Writes the content.</param>
    /// <exception cref="AccessException">Something stands there already, or the place cannot be written.</exception>
    public static void Write(string path, bool replace, Action<Stream> write)
    {
        Refuse(path, replace);
        string beside = Sibling.Name(Path.GetFullPath(path), Sibling.New);
        try
        {
            Access.Try(path, () =>
            {
                using (FileStream stream = new(beside, FileMode.CreateNew))
                {
                    write(stream);
                }

                File.Move(beside, path, replace);
            });
        }
        finally
        {
            File.Delete(beside);
        }
    }

    /// <summary>Declines a place where something stands that must not be overwritten.</summary>
    /// <param name="path">The place.</param>
    /// <param name="replace">Whether a file that stands there may be replaced.</param>
    /// <exception cref="AccessException">Something stands there already, or its folder is missing.</exception>
    public static void Refuse(string path, bool replace)
    {
        if (Directory.Exists(path))
        {
            throw new AccessException($"{path}: this is a folder; name a file");
        }

        if (!replace && File.Exists(path))
        {
            throw new AccessException($"{path}: this file exists and is not overwritten");
        }

        string folder = Path.GetDirectoryName(Path.GetFullPath(path)) ?? "";
        if (!Directory.Exists(folder))
        {
            throw new AccessException($"{path}: there is no folder {folder} to write into");
        }
    }
}
