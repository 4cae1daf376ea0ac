using System.Text;
using CaptureZone.Outputs.Memos.Word;

namespace CaptureZone.Outputs.Memos;

/// <summary>Writes the memo of a report as <c>memo.docx</c> and <c>memo.md</c>, which say the same.</summary>
public static class MemoFiles
{
    /// <summary>Name of the map's picture, to which <c>memo.md</c> points.</summary>
    public const string MapFile = "map.png";

    /// <summary>Writes both files.</summary>
    /// <param name="report">The report.</param>
    /// <param name="mapPng">The map as a PNG picture.</param>
    /// <param name="folder">An existing folder.</param>
    /// <exception cref="IOException">A file cannot be written.</exception>
    public static void Write(Report report, byte[] mapPng, string folder)
    {
        Memo memo = MemoText.Of(report, MapFile);
        File.WriteAllBytes(Path.Combine(folder, "memo.docx"), WordWriter.Write(memo, mapPng));
        File.WriteAllText(Path.Combine(folder, "memo.md"), MarkdownWriter.Write(memo), new UTF8Encoding(false));
    }
}
