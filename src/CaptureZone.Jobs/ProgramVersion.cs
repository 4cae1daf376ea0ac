using System.Reflection;

namespace CaptureZone.Jobs;

/// <summary>The version of this program, as every output states it.</summary>
public static class ProgramVersion
{
    /// <summary>The version, such as "0.1.0".</summary>
    public static string Text { get; } =
        typeof(ProgramVersion).Assembly.GetCustomAttribute<AssemblyInformationalVersionAttribute>()!.InformationalVersion;
}
