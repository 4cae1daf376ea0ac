using System.Collections.Immutable;
using System.CommandLine;
using System.CommandLine.Parsing;
using System.Globalization;
using CaptureZone.Jobs;
using CaptureZone.Jobs.Points;

namespace CaptureZone.Cli;

/// <summary>The two ways of naming points: a table, or one by one.</summary>
internal sealed class PointOptions
{
    private readonly Option<string?> _points = new("--points", "-p")
    {
        Description = "CSV table with the columns name,x,y in the site's coordinates; \"-\" reads it from standard input.",
        HelpName = "P.csv",
    };

    private readonly Option<NamedPoint[]> _at = new("--at")
    {
        Description = "One point in the site's coordinates; may be given again for more.",
        HelpName = "X,Y",
        Arity = ArgumentArity.OneOrMore,
        AllowMultipleArgumentsPerToken = false,
        CustomParser = ParsePoints,
    };

    /// <summary>Adds the options to a command.</summary>
    /// <param name="command">The command.</param>
    public void AddTo(Command command)
    {
        command.Options.Add(_points);
        command.Options.Add(_at);
        command.Validators.Add(result =>
        {
            bool points = result.GetResult(_points) is not null, at = result.GetResult(_at) is not null;
            if (points == at)
            {
                result.AddError(points ? "give either --points or --at, not both" : "give the points: --points P.csv or --at X,Y");
            }
        });
    }

    /// <summary>The points that the command line names.</summary>
    /// <param name="session">The command.</param>
    /// <param name="site">The site file as the command line names it.</param>
    /// <exception cref="InputRefusedException">Something is wrong with the table.</exception>
    public ImmutableArray<NamedPoint> Read(Session session, string site)
    {
        string? table = session.Line.GetValue(_points);
        if (table is null)
        {
            return [.. session.Line.GetValue(_at) ?? []];
        }

        return table == Session.StandardStream && site == Session.StandardStream
            ? throw new RequestException("the site and the points cannot both come from standard input")
            : PointTable.Read(table, session.ReadFile(table));
    }

    private static NamedPoint[] ParsePoints(ArgumentResult argument) =>
        [.. argument.Tokens.Select((token, i) => ParsePoint(argument, token.Value, i + 1))];

    private static NamedPoint ParsePoint(ArgumentResult argument, string text, int number)
    {
        string[] parts = text.Split(',');
        if (parts.Length == 2 && TryNumber(parts[0], out double x) && TryNumber(parts[1], out double y))
        {
            return new NamedPoint(string.Create(CultureInfo.InvariantCulture, $"P{number}"), x, y);
        }

        argument.AddError($"--at is \"{text}\"; expected two numbers such as 562310.5,4641240");
        return new NamedPoint("", 0, 0);
    }

    private static bool TryNumber(string text, out double value) =>
        double.TryParse(text, NumberStyles.Float, CultureInfo.InvariantCulture, out value) && double.IsFinite(value);
}
