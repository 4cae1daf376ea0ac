using System.Text.Json;

namespace CaptureZone.Cli;

/// <summary>What <c>new</c> says after it has written.</summary>
internal static class Summary
{
    /// <summary>Names the file and the next command.</summary>
    /// <param name="session">The command.</param>
    /// <param name="file">The file that was written.</param>
    public static void WriteNew(Session session, string file)
    {
        string next = $"{CommandLine.Name} run {file}";
        session.Output.WriteLine(session.Json
            ? $$"""{"file": {{JsonEncodedText.Encode(file)}}, "next": {{JsonEncodedText.Encode(next)}}}"""
            : $"{file} is written. It runs as it stands; next:\n  {next}");
    }
}
