using System.Collections.Immutable;
using CaptureZone.Sites;

namespace CaptureZone.Outputs.Memos.Sections;

/// <summary>Table 1: every input with its unit, its usual range and its source.</summary>
internal static class InputsSection
{
    public static IEnumerable<Block> Of(Facts facts)
    {
        yield return new Heading(1, "Inputs");
        yield return new Table(
            "Inputs of the calculation.",
            [
                new("Input", 21), new("Value", 9, IsNumeric: true), new("Unit", 9), new("As written", 20), new("Usual range", 22),
                new("Source", 19),
            ],
            [.. facts.Site.Inputs.Select(input => Row(input, facts))]);
        yield return new Paragraph(
            "One year is 365.25 days. The site file in the appendix holds all inputs, outlines of plumes included.");
    }

    private static ImmutableArray<string> Row(InputEntry input, Facts facts)
    {
        (string value, string unit) = Value(input, facts);
        return [Label(input), value, unit, input.Written, input.UsualRange, input.Source.Length == 0 ? "source not given" : input.Source];
    }

    /// <summary>The label with the name of the well or plume, which stands in the key: <c>well.RW-1.extracts</c>.</summary>
    private static string Label(InputEntry input)
    {
        int first = input.Key.IndexOf('.', StringComparison.Ordinal), last = input.Key.LastIndexOf('.');
        string name = last > first ? input.Key[(first + 1)..last] : "";
        return input.Label.Contains(name, StringComparison.Ordinal) ? input.Label : $"{name}: {input.Label}";
    }

    private static (string Value, string Unit) Value(InputEntry input, Facts facts)
    {
        if (input.Quantity == QuantityKind.Place)
        {
            return ("", "");
        }

        string unit = facts.Print.Unit(input.Quantity);
        string entered = facts.Print.Entered(input.Quantity, input.Value);
        return (entered[..^unit.Length].TrimEnd(), unit);
    }
}
