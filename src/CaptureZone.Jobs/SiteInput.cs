using CaptureZone.Sites;
using CaptureZone.Sites.Reading;

namespace CaptureZone.Jobs;

/// <summary>A site file's content with what it takes to find the files that it names.</summary>
/// <param name="FileName">Its name as the user gave it; "-" for standard input.</param>
/// <param name="Bytes">Its content.</param>
/// <param name="Files">Finds the files that it names.</param>
public sealed record SiteInput(string FileName, byte[] Bytes, ISiteFiles Files)
{
    /// <summary>Reads the site.</summary>
    /// <returns>The site, with its warnings.</returns>
    /// <exception cref="InputRefusedException">Something is wrong with it; everything is stated.</exception>
    public SiteDocument Read()
    {
        SiteReading reading = SiteReader.Read(FileName, Bytes, Files);
        return reading.Document ?? throw new InputRefusedException(reading.Complaints);
    }
}
