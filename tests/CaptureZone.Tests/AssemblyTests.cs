using System.Reflection;

namespace CaptureZone.Tests;

public sealed class AssemblyTests
{
    /// <summary>References run one way: Cli, Jobs, Outputs, Sites, engine.</summary>
    [Theory]
    [InlineData("CaptureZone", new string[0])]
    [InlineData("CaptureZone.Sites", new[] { "CaptureZone" })]
    [InlineData("CaptureZone.Outputs", new[] { "CaptureZone", "CaptureZone.Sites" })]
    [InlineData("CaptureZone.Jobs", new[] { "CaptureZone", "CaptureZone.Sites", "CaptureZone.Outputs" })]
    public void A_part_references_only_the_parts_below_it(string part, string[] below)
    {
        string[] referenced =
        [
            .. Assembly.Load(part).GetReferencedAssemblies()
                .Select(name => name.Name!)
                .Where(name => name.StartsWith("CaptureZone", StringComparison.Ordinal)),
        ];
        Assert.Subset(below.ToHashSet(), referenced.ToHashSet());
    }
}
