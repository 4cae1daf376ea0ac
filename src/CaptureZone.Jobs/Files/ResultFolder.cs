using System.Collections.Immutable;

namespace CaptureZone.Jobs.Files;

/// <summary>
/// A result folder that appears whole or not at all. Files go into a sibling folder, which takes the final name when it is
/// complete; what stood there before is moved aside first and deleted last. Whatever a run that was killed has left behind, the next
/// run puts right. Use with <c>using</c>: without <see cref="Complete"/>, nothing remains.
/// </summary>
public sealed class ResultFolder : IDisposable
{
    private const int NamedChanges = 5;

    private readonly string _shown;
    private readonly string _final;
    private readonly bool _replace;
    private FileStream? _lock;

    private ResultFolder(string shown, string final, bool replace)
    {
        _shown = shown;
        _final = final;
        _replace = replace;
        WorkPath = Sibling.Name(final, Sibling.New);
        Directory.CreateDirectory(WorkPath);
        _lock = new FileStream(Path.Combine(WorkPath, FolderRecord.LockName), FileMode.CreateNew, FileAccess.Write, FileShare.None);
    }

    /// <summary>Where the files go until the folder is complete.</summary>
    public string WorkPath { get; private set; }

    /// <summary>Begins a folder, once it is certain that it may take its place.</summary>
    /// <param name="path">The place.</param>
    /// <param name="replace">Whether a folder of this program's may be replaced though someone has worked in it.</param>
    /// <param name="keep">Files that must not lie in the folder, since they would be lost with it.</param>
    /// <exception cref="AccessException">Something else stands there, or the place cannot be written.</exception>
    public static ResultFolder Begin(string path, bool replace, params ReadOnlySpan<string> keep)
    {
        string final = Path.TrimEndingDirectorySeparator(Path.GetFullPath(path));
        string? parent = Path.GetDirectoryName(final);
        if (parent is null || !Directory.Exists(parent))
        {
            throw new AccessException($"{path}: there is no folder {parent ?? final} to make the results in");
        }

        foreach (string file in keep)
        {
            RefuseToHold(path, final, Path.GetFullPath(file));
        }

        return Access.Try(path, () =>
        {
            Recover(final);
            RefuseTaken(path, final, replace);
            return new ResultFolder(path, final, replace);
        });
    }

    /// <summary>Gives the folder its final name.</summary>
    /// <exception cref="AccessException">The place was taken meanwhile, or cannot be written.</exception>
    public void Complete() => Access.Try(_shown, () =>
    {
        FolderRecord.Write(WorkPath);
        RefuseTaken(_shown, _final, _replace);
        if (OperatingSystem.IsWindows())
        {
            Release(WorkPath); // Windows moves no folder in which a file is open.
        }

        string? old = MoveAside();
        try
        {
            Directory.Move(WorkPath, _final);
        }
        catch (Exception) when (old is not null)
        {
            Directory.Move(old, _final);
            throw;
        }

        Release(_final);
        WorkPath = _final;
        if (old is not null)
        {
            Directory.Delete(old, recursive: true);
        }
    });

    /// <summary>Removes what was written, unless the folder is complete.</summary>
    public void Dispose()
    {
        _lock?.Dispose();
        _lock = null;
        if (WorkPath != _final && Directory.Exists(WorkPath))
        {
            Directory.Delete(WorkPath, recursive: true);
        }
    }

    private string? MoveAside()
    {
        if (!Directory.Exists(_final))
        {
            return null;
        }

        string old = Sibling.Name(_final, Sibling.Old);
        Directory.Move(_final, old);
        return old;
    }

    private void Release(string folder)
    {
        _lock?.Dispose();
        _lock = null;
        File.Delete(Path.Combine(folder, FolderRecord.LockName));
    }

    /// <summary>Puts right what a run that was killed has left: its siblings, or the old folder still moved aside.</summary>
    private static void Recover(string final)
    {
        foreach (string old in Sibling.FoldersOf(final, Sibling.Old).Where(FolderRecord.IsIn))
        {
            if (Path.Exists(final))
            {
                Directory.Delete(old, recursive: true);
            }
            else
            {
                Directory.Move(old, final);
            }
        }

        foreach (string left in Sibling.FoldersOf(final, Sibling.New).Where(IsAbandoned))
        {
            Directory.Delete(left, recursive: true);
        }
    }

    /// <summary>Whether nobody writes in a sibling any more: the system drops the lock of a process that ends, however it ends.</summary>
    private static bool IsAbandoned(string sibling)
    {
        try
        {
            using FileStream free = new(Path.Combine(sibling, FolderRecord.LockName), FileMode.Open, FileAccess.Write, FileShare.None);
            return true;
        }
        catch (FileNotFoundException)
        {
            return true;
        }
        catch (IOException)
        {
            return false;
        }
    }

    private static void RefuseToHold(string path, string final, string file)
    {
        if (file.StartsWith(final + Path.DirectorySeparatorChar, StringComparison.Ordinal))
        {
            throw new AccessException($"{path}: {file} lies in this folder and would be lost; give another --out");
        }
    }

    private static void RefuseTaken(string path, string final, bool replace)
    {
        if (new DirectoryInfo(final).LinkTarget is not null)
        {
            throw new AccessException($"{path}: this is a link; give the folder itself as --out");
        }

        if (File.Exists(final))
        {
            throw new AccessException($"{path}: this is a file; give a folder as --out");
        }

        if (!Directory.Exists(final) || !Directory.EnumerateFileSystemEntries(final).Any())
        {
            return;
        }

        if (!FolderRecord.IsIn(final))
        {
            throw new AccessException($"{path}: this folder holds files that are not this program's results; give another --out");
        }

        if (!replace && FolderRecord.ChangesIn(final) is { IsEmpty: false } changes)
        {
            throw new AccessException(
                $"{path}: kept, since someone worked in it ({Named(changes)}); give another --out, or --replace to lose these changes");
        }
    }

    private static string Named(ImmutableArray<string> changes) =>
        string.Join(", ", changes.Take(NamedChanges)) + (changes.Length > NamedChanges ? ", ..." : "");
}
