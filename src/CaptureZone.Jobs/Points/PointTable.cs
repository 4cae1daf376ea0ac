using System.Collections.Immutable;
using System.Globalization;
using System.Text;
using CaptureZone.Jobs.Tables;
using CaptureZone.Sites;

namespace CaptureZone.Jobs.Points;

/// <summary>Reads a table of points: CSV in UTF-8 with the columns name, x and y, in any order, among others or not.</summary>
public static class PointTable
{
    private static readonly ImmutableArray<string> _columns = ["name", "x", "y"];

    /// <summary>Reads the points.</summary>
    /// <param name="fileName">The file's name as the user gave it, for complaints.</param>
    /// <param name="bytes">Its content.</param>
    /// <exception cref="InputRefusedException">Something is wrong with it; everything is stated.</exception>
    public static ImmutableArray<NamedPoint> Read(string fileName, ReadOnlySpan<byte> bytes)
    {
        ImmutableArray<ImmutableArray<CsvField>> rows = CsvRows.Of(Decode(fileName, bytes));
        if (rows.IsEmpty)
        {
            throw Refusal(fileName, 1, 1, "the table is empty; expected a line \"name,x,y\" and one line for each point");
        }

        int[] columns = [.. _columns.Select(column => Find(rows[0], column))];
        if (columns.Contains(-1))
        {
            throw Refusal(fileName, rows[0][0].Line, 1, HeaderComplaint(rows[0]));
        }

        PointReader reader = new(fileName, columns, rows[0].Length);
        ImmutableArray<NamedPoint> points = [.. rows[1..].Select(reader.Read).OfType<NamedPoint>()];
        if (reader.Complaints.Count > 0)
        {
            throw new InputRefusedException([.. reader.Complaints]);
        }

        return points.IsEmpty
            ? throw Refusal(fileName, rows[0][0].Line, 1, "the table has a heading but no point below it")
            : points;
    }

    private static string Decode(string fileName, ReadOnlySpan<byte> bytes)
    {
        try
        {
            return new UTF8Encoding(false, throwOnInvalidBytes: true).GetString(bytes).TrimStart('\uFEFF');
        }
        catch (DecoderFallbackException failure)
        {
            int before = Math.Clamp(failure.Index, 0, bytes.Length);
            int line = bytes[..before].Count((byte)'\n') + 1;
            throw Refusal(fileName, line, 1, "this line is not UTF-8 text; save the table as \"CSV UTF-8\"");
        }
    }

    private static int Find(ImmutableArray<CsvField> header, string column)
    {
        for (int i = 0; i < header.Length; i++)
        {
            if (header[i].Text.Equals(column, StringComparison.OrdinalIgnoreCase))
            {
                return i;
            }
        }

        return -1;
    }

    private static string HeaderComplaint(ImmutableArray<CsvField> header) =>
        header.Any(field => field.Text.Contains(';', StringComparison.Ordinal))
            ? "the columns are separated by semicolons; expected commas between them and points in numbers"
            : $"the first line is \"{string.Join(',', header.Select(field => field.Text))}\"; expected the columns name,x,y";

    private static InputRefusedException Refusal(string fileName, int line, int column, string text) =>
        new([new Complaint(fileName, line, column, Severity.Error, text)]);

    private sealed class PointReader(string fileName, int[] columns, int fields)
    {
        public List<Complaint> Complaints { get; } = [];

        public NamedPoint? Read(ImmutableArray<CsvField> row)
        {
            if (row.Length != fields)
            {
                Complain(
                    row[0],
                    $"this line has {row.Length} fields, the heading {fields}; a number takes a point, a name with a comma quotes");
                return null;
            }

            CsvField name = row[columns[0]];
            if (name.Text.Length == 0)
            {
                Complain(name, "this point has no name");
            }

            double x = Number(row[columns[1]], "x"), y = Number(row[columns[2]], "y");
            return new NamedPoint(name.Text, x, y);
        }

        private double Number(CsvField field, string column)
        {
            if (double.TryParse(field.Text, NumberStyles.Float, CultureInfo.InvariantCulture, out double value) && double.IsFinite(value))
            {
                return value;
            }

            Complain(field, $"{column} is \"{field.Text}\"; expected a number such as 562310.5, in the site's coordinates");
            return 0;
        }

        private void Complain(CsvField field, string text) =>
            Complaints.Add(new Complaint(fileName, field.Line, field.Column, Severity.Error, text));
    }
}
