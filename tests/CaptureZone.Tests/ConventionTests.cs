using System.Collections.Immutable;
using System.Reflection;
using System.Reflection.Metadata;
using System.Reflection.PortableExecutable;
using System.Runtime.CompilerServices;
using CaptureZone.Elements;
using CaptureZone.Flow;
using CaptureZone.Tests.Elements;

namespace CaptureZone.Tests;

/// <summary>Rules of the house that the compiler does not hold.</summary>
public sealed class ConventionTests
{
    /// <summary>Public types that may be changed from outside, each with the reason.</summary>
    private static readonly Dictionary<Type, string> MayChange = new()
    {
        [typeof(PointFlow)] = "handed from bank to bank by reference and summed into, on the path tracer's innermost loop",
    };

    private static readonly Assembly Engine = typeof(Model).Assembly;

    public static TheoryData<string> Parts =>
        ["CaptureZone", "CaptureZone.Sites", "CaptureZone.Outputs", "CaptureZone.Jobs"];

    [Fact]
    public void Every_element_has_a_contract_test()
    {
        IEnumerable<Type> elements = Engine.GetTypes().Where(type => type.IsSubclassOf(typeof(Element)) && !type.IsAbstract);
        HashSet<Type> tested =
        [
            .. typeof(ConventionTests).Assembly.GetTypes()
                .Where(type => type is { IsAbstract: false, IsPublic: true, BaseType.IsGenericType: true })
                .Where(type => type.BaseType!.GetGenericTypeDefinition() == typeof(ElementContract<>))
                .Select(type => type.BaseType!.GetGenericArguments()[0]),
        ];
        Assert.NotEmpty(elements);
        Assert.All(elements, element => Assert.Contains(element, tested));
    }

    [Theory]
    [MemberData(nameof(Parts))]
    public void Public_classes_are_sealed_or_abstract(string part) =>
        Assert.All(
            Assembly.Load(part).GetExportedTypes().Where(type => type.IsClass),
            type => Assert.True(type.IsSealed || type.IsAbstract, type.FullName));

    [Theory]
    [MemberData(nameof(Parts))]
    public void Public_types_cannot_be_changed_from_outside(string part)
    {
        foreach (Type type in Assembly.Load(part).GetExportedTypes().Where(type => !type.IsEnum && !MayChange.ContainsKey(type)))
        {
            const BindingFlags all = BindingFlags.Public | BindingFlags.Instance | BindingFlags.Static | BindingFlags.DeclaredOnly;
            Assert.All(type.GetFields(all), field => Assert.True(field.IsInitOnly || field.IsLiteral, $"{type}.{field.Name}"));
            Assert.All(type.GetProperties(all), property => Assert.False(CanBeSet(property), $"{type}.{property.Name}"));
        }
    }

    [Theory]
    [MemberData(nameof(Parts))]
    public void No_static_field_changes(string part)
    {
        const BindingFlags statics = BindingFlags.Public | BindingFlags.NonPublic | BindingFlags.Static | BindingFlags.DeclaredOnly;
        IEnumerable<FieldInfo> fields = Assembly.Load(part).GetTypes()
            .Where(type => !type.Name.Contains('<', StringComparison.Ordinal))
            .SelectMany(type => type.GetFields(statics))
            .Where(field => !field.Name.StartsWith("<>", StringComparison.Ordinal));
        Assert.All(fields, field => Assert.True(field.IsInitOnly || field.IsLiteral, $"{field.DeclaringType}.{field.Name}"));
    }

    [Fact]
    public void The_engine_knows_no_console_no_file_no_clock_and_no_surroundings()
    {
        using PEReader image = new(File.OpenRead(Engine.Location));
        MetadataReader metadata = image.GetMetadataReader();
        ImmutableArray<string> types =
        [
            .. metadata.TypeReferences.Select(metadata.GetTypeReference)
                .Select(type => $"{metadata.GetString(type.Namespace)}.{metadata.GetString(type.Name)}"),
        ];
        ImmutableArray<string> members =
        [
            .. metadata.MemberReferences.Select(metadata.GetMemberReference)
                .Where(member => member.Parent.Kind == HandleKind.TypeReference)
                .Select(member =>
                    $"{metadata.GetString(metadata.GetTypeReference((TypeReferenceHandle)member.Parent).Name)}.{metadata.GetString(member.Name)}"),
        ];
        Assert.Contains("System.Math", types);
        string[] barred = ["System.Console", "System.Random", "System.Diagnostics.Stopwatch"];
        Assert.Empty(types.Intersect(barred));
        Assert.DoesNotContain(types, type => type.StartsWith("System.IO.", StringComparison.Ordinal));
        // Iterators that the compiler makes ask which thread they are on.
        Assert.DoesNotContain(members, member =>
            member.StartsWith("Environment.", StringComparison.Ordinal) && member != "Environment.get_CurrentManagedThreadId");
        Assert.Empty(members.Intersect(["DateTime.get_Now", "DateTime.get_UtcNow", "DateTimeOffset.get_Now", "DateTimeOffset.get_UtcNow"]));
        Assert.Empty(Engine.GetReferencedAssemblies().Select(name => name.Name)
            .Intersect(["System.Console", "System.IO.FileSystem"]));
    }

    private static bool CanBeSet(PropertyInfo property) =>
        property.SetMethod is { IsPublic: true } set
        && !set.ReturnParameter.GetRequiredCustomModifiers().Contains(typeof(IsExternalInit));
}
