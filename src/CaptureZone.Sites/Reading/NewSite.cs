namespace CaptureZone.Sites.Reading;

/// <summary>A commented site file to start from; it runs as it stands.</summary>
public static class NewSite
{
    /// <summary>The file's text.</summary>
    /// <param name="us">In feet and gallons per minute, else in metres and litres per second.</param>
    public static string Text(bool us)
    {
        string name = us ? "new-site-us.toml" : "new-site.toml";
        using Stream stream = typeof(NewSite).Assembly.GetManifestResourceStream(name)!;
        using StreamReader reader = new(stream);
        return reader.ReadToEnd();
    }
}
