using System.Collections.Immutable;
using System.Text;
using CaptureZone.Sites.Reading.Sections;
using CaptureZone.Sites.Reading.Toml;

namespace CaptureZone.Sites.Reading;

/// <summary>Reads a site file: into a document, or into everything that is wrong with it, at once.</summary>
public static class SiteReader
{
    /// <summary>Every key that a site file may hold, such as "crs", "aquifer.conductivity" and "well.extracts".</summary>
    public static ImmutableArray<string> Keys => KnownKeys.All();

    /// <summary>Reads a site file. Never throws for what the file holds.</summary>
    /// <param name="fileName">The file's name as the user gave it, for complaints; "-" for standard input.</param>
    /// <param name="bytes">The file's bytes: TOML 1.0 in UTF-8, with or without a byte order mark.</param>
    /// <param name="files">The files that the site file may name.</param>
    public static SiteReading Read(string fileName, byte[] bytes, ISiteFiles files)
    {
        SourceText? source = Decode(fileName, bytes, out Complaint? undecodable);
        if (source is null)
        {
            return new SiteReading(null, [undecodable!]);
        }

        Complaints complaints = new(fileName, source);
        SiteContext site = new(complaints, new NamedFiles(files));
        SiteDraft? draft = Draft(site);
        if (draft is not null)
        {
            SiteChecks.Check(draft, site);
        }

        SiteDocument? document = draft is null || complaints.HasErrors ? null : new SiteAssembly(draft, site).Document(fileName, bytes);
        return new SiteReading(document, complaints.InOrder());
    }

    private static SiteDraft? Draft(SiteContext site)
    {
        if (string.IsNullOrWhiteSpace(site.Complaints.Source.Text))
        {
            site.Complaints.Error(0, "the file is empty; \"capturezone new FILE\" writes one to start from");
            return null;
        }

        return TomlParser.Parse(site.Complaints) is { } root ? RootSection.Read(new TableReader(site, root, "the site file", "")) : null;
    }

    private static SourceText? Decode(string fileName, byte[] bytes, out Complaint? problem)
    {
        problem = null;
        ReadOnlySpan<byte> content = bytes;
        if (content.StartsWith((ReadOnlySpan<byte>)[0xFF, 0xFE]) || content.StartsWith((ReadOnlySpan<byte>)[0xFE, 0xFF]))
        {
            problem = new Complaint(fileName, 1, 1, Severity.Error, "the file is in UTF-16; save it as UTF-8");
            return null;
        }

        content = content.StartsWith("\uFEFF"u8) ? content[3..] : content;
        int bad = FirstInvalid(content);
        if (bad < 0)
        {
            return new SourceText(Encoding.UTF8.GetString(content));
        }

        SourceText before = new(Encoding.UTF8.GetString(content[..bad]));
        (int line, int column) = before.PlaceOf(bad);
        string found = content[bad].ToString("x2", System.Globalization.CultureInfo.InvariantCulture);
        problem = new Complaint(fileName, line, column, Severity.Error, $"the byte 0x{found} is no UTF-8; save the file as UTF-8");
        return null;
    }

    /// <summary>Index of the first byte that is no UTF-8; -1 where all are.</summary>
    private static int FirstInvalid(ReadOnlySpan<byte> bytes)
    {
        int at = 0;
        while (at < bytes.Length)
        {
            if (Rune.DecodeFromUtf8(bytes[at..], out _, out int length) != System.Buffers.OperationStatus.Done)
            {
                return at;
            }

            at += length;
        }

        return -1;
    }
}
