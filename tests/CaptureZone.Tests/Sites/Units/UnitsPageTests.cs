using System.Globalization;
using CaptureZone.Sites.Units;

namespace CaptureZone.Tests.Sites.Units;

public sealed class UnitsPageTests
{
    [Fact]
    public void The_page_lists_exactly_the_units_of_the_table_with_their_exact_factors()
    {
        string[] listed = [.. File.ReadLines(Page()).Where(line => line.StartsWith("| `", StringComparison.Ordinal))];
        Assert.Equal(UnitTable.Units.Select(Row), listed);
    }

    [Fact]
    public void Every_exact_factor_is_what_its_double_rounds()
    {
        foreach (Unit unit in UnitTable.Units)
        {
            string[] parts = unit.ExactFactor.Split(" / ");
            double value = parts.Select(part => double.Parse(part, CultureInfo.InvariantCulture)).Aggregate((a, b) => a / b);
            Assert.Equal(value, unit.Factor, Math.BitIncrement(unit.Factor) - unit.Factor);
        }
    }

    private static string Row(Unit unit)
    {
        string also = string.Join(", ", unit.AlsoWritten.Select(text => $"`{text}`"));
        string rounded = unit.Factor.ToString("R", CultureInfo.InvariantCulture);
        return $"| `{unit.Symbol}` | {also} | {unit.Definition} | {unit.ExactFactor} | {rounded} |".Replace("|  |", "| |", StringComparison.Ordinal);
    }

    private static string Page()
    {
        DirectoryInfo? folder = new(AppContext.BaseDirectory);
        while (folder is not null && !File.Exists(Path.Combine(folder.FullName, "CaptureZone.sln")))
        {
            folder = folder.Parent;
        }

        Assert.NotNull(folder);
        return Path.Combine(folder.FullName, "docs", "units.md");
    }
}
