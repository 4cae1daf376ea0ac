using System.Collections.Immutable;

namespace CaptureZone.Sites.Units;

/// <summary>A unit in which a site file may give a quantity.</summary>
public sealed record Unit
{
    internal Unit(string symbol, Measure measure, string definition, ImmutableArray<string> alsoWritten)
    {
        Symbol = symbol;
        Dimension = measure.Dimension;
        Measure = measure;
        Factor = measure.Factor.ToDouble();
        Definition = definition;
        AlsoWritten = alsoWritten;
    }

    /// <summary>As it is printed: "m2/d".</summary>
    public string Symbol { get; }

    /// <summary>
    /// The first dimension that it measures; units of time also measure a resistance, units of conductivity also a rate of recharge.
    /// </summary>
    public Dimension Dimension { get; }

    /// <summary>How many of metres and days it is: the double nearest to <see cref="ExactFactor"/>.</summary>
    public double Factor { get; }

    /// <summary>The same, not rounded: a decimal, or a fraction "a / b".</summary>
    public string ExactFactor => Measure.Factor.ToString();

    /// <summary>How the factor derives from exact definitions.</summary>
    public string Definition { get; }

    /// <summary>Other symbols that are read as this unit.</summary>
    public ImmutableArray<string> AlsoWritten { get; }

    /// <summary>The amount that the unit stands for.</summary>
    internal Measure Measure { get; }
}
