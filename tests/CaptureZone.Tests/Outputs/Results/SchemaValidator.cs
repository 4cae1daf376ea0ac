using System.Globalization;
using System.Text.Json;
using System.Text.RegularExpressions;

namespace CaptureZone.Tests.Outputs.Results;

/// <summary>
/// Validates a document against a JSON Schema (draft 2020-12), as far as the keywords go that our schema uses; any other keyword is an
/// error, so that nothing passes unread.
/// </summary>
public sealed class SchemaValidator(JsonElement schema)
{
    /// <summary>Every breach, as place and keyword.</summary>
    public IReadOnlyList<string> Breaches(JsonElement document)
    {
        List<string> breaches = [];
        Check(schema, document, "$", breaches);
        return breaches;
    }

    private void Check(JsonElement rules, JsonElement value, string at, List<string> breaches)
    {
        foreach (JsonProperty rule in rules.EnumerateObject())
        {
            if (!Keeps(rules, rule, value, at, breaches))
            {
                breaches.Add($"{at}: {rule.Name}");
            }
        }
    }

    private bool Keeps(JsonElement rules, JsonProperty rule, JsonElement value, string at, List<string> breaches)
    {
        switch (rule.Name)
        {
            case "$schema" or "$id" or "$defs" or "title" or "description":
                return true;
            case "$ref":
                Check(Referred(rule.Value.GetString()!), value, at, breaches);
                return true;
            case "type":
                return Names(rule.Value).Any(type => IsOf(type, value));
            case "enum":
                return rule.Value.EnumerateArray().Any(allowed => JsonElement.DeepEquals(allowed, value));
            case "pattern":
                return value.ValueKind != JsonValueKind.String || Regex.IsMatch(value.GetString()!, rule.Value.GetString()!);
            case "minimum":
                return value.ValueKind != JsonValueKind.Number || value.GetDouble() >= rule.Value.GetDouble();
            case "maximum":
                return value.ValueKind != JsonValueKind.Number || value.GetDouble() <= rule.Value.GetDouble();
            case "minItems":
                return value.ValueKind != JsonValueKind.Array || value.GetArrayLength() >= rule.Value.GetInt32();
            case "maxItems":
                return value.ValueKind != JsonValueKind.Array || value.GetArrayLength() <= rule.Value.GetInt32();
            case "required":
                return value.ValueKind != JsonValueKind.Object || Names(rule.Value).All(name => value.TryGetProperty(name, out _));
            case "additionalProperties" when rule.Value.ValueKind == JsonValueKind.False:
                return value.ValueKind != JsonValueKind.Object
                    || value.EnumerateObject().All(member => rules.GetProperty("properties").TryGetProperty(member.Name, out _));
            case "properties":
                CheckMembers(rule.Value, value, at, breaches);
                return true;
            case "items":
                CheckItems(rule.Value, value, at, breaches);
                return true;
            default:
                throw new NotSupportedException($"The validator does not know the keyword {rule.Name}.");
        }
    }

    private void CheckMembers(JsonElement rules, JsonElement value, string at, List<string> breaches)
    {
        if (value.ValueKind != JsonValueKind.Object)
        {
            return;
        }

        foreach (JsonProperty rule in rules.EnumerateObject())
        {
            if (value.TryGetProperty(rule.Name, out JsonElement member))
            {
                Check(rule.Value, member, $"{at}.{rule.Name}", breaches);
            }
        }
    }

    private void CheckItems(JsonElement rules, JsonElement value, string at, List<string> breaches)
    {
        if (value.ValueKind != JsonValueKind.Array)
        {
            return;
        }

        int index = 0;
        foreach (JsonElement item in value.EnumerateArray())
        {
            Check(rules, item, string.Create(CultureInfo.InvariantCulture, $"{at}[{index++}]"), breaches);
        }
    }

    private JsonElement Referred(string reference)
    {
        const string Prefix = "#/$defs/";
        Assert.StartsWith(Prefix, reference, StringComparison.Ordinal);
        return schema.GetProperty("$defs").GetProperty(reference[Prefix.Length..]);
    }

    private static IEnumerable<string> Names(JsonElement value) => value.ValueKind == JsonValueKind.Array
        ? value.EnumerateArray().Select(name => name.GetString()!)
        : [value.GetString()!];

    private static bool IsOf(string type, JsonElement value) => type switch
    {
        "object" => value.ValueKind == JsonValueKind.Object,
        "array" => value.ValueKind == JsonValueKind.Array,
        "string" => value.ValueKind == JsonValueKind.String,
        "number" => value.ValueKind == JsonValueKind.Number,
        "integer" => value.ValueKind == JsonValueKind.Number && double.IsInteger(value.GetDouble()),
        "boolean" => value.ValueKind is JsonValueKind.True or JsonValueKind.False,
        "null" => value.ValueKind == JsonValueKind.Null,
        _ => throw new NotSupportedException($"The validator does not know the type {type}."),
    };
}
