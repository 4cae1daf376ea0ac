using CaptureZone.Sites;
using CaptureZone.Sites.Coordinates;

namespace CaptureZone.Tests.Sites.Coordinates;

/// <summary>A folder of its own for each test, with the definition files that it needs.</summary>
public sealed class SiteFolder : IDisposable
{
    private readonly DirectoryInfo _folder = Directory.CreateTempSubdirectory("site");

    public string Path => _folder.FullName;

    public DiskFiles Files => new(Path);

    public void Dispose() => _folder.Delete(recursive: true);

    /// <summary>The system of a definition's text, or of a code.</summary>
    public ProjectedSystem System(string definition)
    {
        string stated = Stated(definition);
        Assert.True(CoordinateSystems.TryRead(stated, Files, out CoordinateSystem? system, out string problem), problem);
        Assert.Empty(problem);
        return Assert.IsType<ProjectedSystem>(system);
    }

    /// <summary>What is wrong with a stated system or a definition's text.</summary>
    public string Problem(string definition)
    {
        Assert.False(CoordinateSystems.TryRead(Stated(definition), Files, out CoordinateSystem? system, out string problem));
        Assert.Null(system);
        return problem;
    }

    private string Stated(string definition)
    {
        if (!definition.Contains('[', StringComparison.Ordinal))
        {
            return definition;
        }

        File.WriteAllText(global::System.IO.Path.Combine(Path, "site.prj"), definition);
        return "site.prj";
    }
}
