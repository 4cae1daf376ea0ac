using System.Text;
using CaptureZone.Jobs;
using CaptureZone.Jobs.Files;

namespace CaptureZone.Cli;

/// <summary>Where a table goes: to a file, whole or not at all, or to standard output.</summary>
internal static class TableOutput
{
    /// <summary>Writes a table, and its JSON form to standard output where that is asked for.</summary>
    /// <param name="session">The command.</param>
    /// <param name="path">The file; null or "-" for standard output.</param>
    /// <param name="replace">Whether a file that stands there may be replaced.</param>
    /// <param name="csv">Writes the table.</param>
    /// <param name="json">Writes its JSON form.</param>
    /// <exception cref="AccessException">The file exists or cannot be written.</exception>
    public static void Write(Session session, string? path, bool replace, Action<TextWriter> csv, Action<TextWriter> json)
    {
        bool toFile = path is not (null or Session.StandardStream);
        if (toFile)
        {
            WholeFile.Write(path!, replace, stream =>
            {
                using StreamWriter writer = new(stream, new UTF8Encoding(false));
                csv(writer);
            });
        }

        if (session.Json)
        {
            json(session.Output);
        }
        else if (!toFile)
        {
            csv(session.Output);
        }
    }
}
