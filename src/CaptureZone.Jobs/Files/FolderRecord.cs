using System.Collections.Immutable;
using System.Security.Cryptography;
using System.Text.Json;

namespace CaptureZone.Jobs.Files;

/// <summary>
/// The record that a result folder keeps of itself: the SHA-256 of every file as it was written. It tells a folder that this
/// program made from any other, and whether anyone has worked in it since.
/// </summary>
internal static class FolderRecord
{
    /// <summary>The record's own file.</summary>
    public const string FileName = ".capturezone-folder.json";

    /// <summary>The file that is held open while a folder is being written.</summary>
    public const string LockName = ".capturezone-writing";

    private const string FilesKey = "files";

    private static readonly JsonWriterOptions _indented = new() { Indented = true, NewLine = "\n" };

    /// <summary>Writes the record of a folder that is complete.</summary>
    /// <param name="folder">The folder.</param>
    public static void Write(string folder)
    {
        using FileStream stream = File.Create(Path.Combine(folder, FileName));
        using Utf8JsonWriter json = new(stream, _indented);
        json.WriteStartObject();
        json.WriteString("made_by", "capturezone");
        json.WriteStartObject(FilesKey);
        foreach (string file in FilesIn(folder))
        {
            json.WriteString(file, HashOf(Path.Combine(folder, file)));
        }

        json.WriteEndObject();
        json.WriteEndObject();
    }

    /// <summary>Whether a folder carries a record, so that this program made it.</summary>
    /// <param name="folder">The folder.</param>
    public static bool IsIn(string folder) => Read(folder) is not null;

    /// <summary>What was changed or added since the record was written, in words; what was deleted is no loss to anyone.</summary>
    /// <param name="folder">A folder with a record.</param>
    public static ImmutableArray<string> ChangesIn(string folder)
    {
        Dictionary<string, string> record = Read(folder) ?? [];
        ImmutableArray<string>.Builder changes = ImmutableArray.CreateBuilder<string>();
        foreach (string file in FilesIn(folder))
        {
            if (!record.TryGetValue(file, out string? hash))
            {
                changes.Add($"{file} was added");
            }
            else if (IsLink(folder, file) || HashOf(Path.Combine(folder, file)) != hash)
            {
                changes.Add($"{file} was changed");
            }
        }

        return changes.ToImmutable();
    }

    private static Dictionary<string, string>? Read(string folder)
    {
        string path = Path.Combine(folder, FileName);
        if (!File.Exists(path))
        {
            return null;
        }

        try
        {
            using JsonDocument json = JsonDocument.Parse(File.ReadAllBytes(path));
            return json.RootElement.GetProperty(FilesKey).EnumerateObject()
                .ToDictionary(entry => entry.Name, entry => entry.Value.GetString()!, StringComparer.Ordinal);
        }
        catch (Exception failure) when (failure is JsonException or KeyNotFoundException or InvalidOperationException or ArgumentException)
        {
            return null;
        }
    }

    /// <summary>Every file and link below a folder but the program's own, with '/' between parts; links are not followed.</summary>
    private static IEnumerable<string> FilesIn(string folder) =>
        Below(new DirectoryInfo(folder), "")
            .Where(file => file is not (FileName or LockName))
            .Order(StringComparer.Ordinal);

    private static IEnumerable<string> Below(DirectoryInfo folder, string prefix) =>
        folder.EnumerateFileSystemInfos().SelectMany(entry =>
            entry is DirectoryInfo { LinkTarget: null } inner ? Below(inner, prefix + entry.Name + "/") : [prefix + entry.Name]);

    private static bool IsLink(string folder, string file) => new FileInfo(Path.Combine(folder, file)).LinkTarget is not null;

    private static string HashOf(string path)
    {
        using FileStream stream = File.OpenRead(path);
        return Convert.ToHexStringLower(SHA256.HashData(stream));
    }
}
