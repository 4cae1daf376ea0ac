using System.Globalization;

namespace CaptureZone.Jobs.Tables;

/// <summary>Comma-separated values by RFC 4180, written the same in every culture, with line feeds between lines.</summary>
public static class CsvText
{
    /// <summary>Significant digits of every figure: enough for a millimetre in a coordinate of thousands of kilometres.</summary>
    private const string Figures = "G10";

    /// <summary>A figure; empty when it is no number.</summary>
    /// <param name="value">The figure.</param>
    public static string Figure(double value) =>
        double.IsFinite(value) ? (value + 0.0).ToString(Figures, CultureInfo.InvariantCulture) : "";

    /// <summary>Writes one line.</summary>
    /// <param name="to">Where to.</param>
    /// <param name="fields">Its fields; quoted where they need it.</param>
    public static void WriteLine(TextWriter to, params ReadOnlySpan<string> fields)
    {
        for (int i = 0; i < fields.Length; i++)
        {
            if (i > 0)
            {
                to.Write(',');
            }

            to.Write(Quoted(fields[i]));
        }

        to.Write('\n');
    }

    private static string Quoted(string field) =>
        field.AsSpan().ContainsAny(",\"\r\n") || field != field.Trim()
            ? "\"" + field.Replace("\"", "\"\"", StringComparison.Ordinal) + "\""
            : field;
}
