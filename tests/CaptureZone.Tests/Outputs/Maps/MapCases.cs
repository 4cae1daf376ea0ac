using System.Collections.Immutable;
using System.Numerics;
using CaptureZone.Elements;
using CaptureZone.Elements.Wells;
using CaptureZone.Outputs;
using CaptureZone.Outputs.Maps;
using NetTopologySuite.Geometries;
using SkiaSharp;

namespace CaptureZone.Tests.Outputs.Maps;

/// <summary>Maps for tests: seeded sites with clustered wells, and a canvas that keeps what is written on it.</summary>
internal static class MapCases
{
    /// <summary>The sample with other wells, most in clusters of a few metres, some idle, some injecting, in another frame.</summary>
    public static Report Clustered(int seed, int wells)
    {
        Random random = new(seed);
        Report sample = SampleReport.Create();
        double height = 200 + 1500 * random.NextDouble();
        Envelope extent = new(-900, 1300, -height / 2, height / 2);
        Complex[] middles = [.. Enumerable.Range(0, 1 + random.Next(4)).Select(_ => Anywhere(random, extent))];
        IEnumerable<Element> others = sample.Site.Model.Elements.Where(element => element is not Well);
        Well[] made = [.. Enumerable.Range(0, wells).Select(i => MakeWell(random, i, middles, extent))];
        Model model = sample.Site.Model with { Elements = [.. others, .. made] };
        return sample with
        {
            Site = sample.Site with { Model = model },
            Answers = sample.Answers with { Wells = [], Extent = extent },
        };
    }

    private static Well MakeWell(Random random, int index, Complex[] middles, Envelope extent)
    {
        const double Spread = 8;
        Complex at = random.Next(4) == 0
            ? Anywhere(random, extent)
            : middles[random.Next(middles.Length)] + new Complex(Spread * random.NextDouble(), Spread * random.NextDouble());
        string name = $"W-{index}{new string('x', random.Next(12))}";
        return new Well(name, at, 100 * (random.Next(3) - 1), 0.15, (WellPurpose)random.Next(3));
    }

    /// <summary>Not so near the frame that a well or a cluster leaves it.</summary>
    private static Complex Anywhere(Random random, Envelope extent) => new(
        extent.MinX + extent.Width * (0.02 + 0.9 * random.NextDouble()), extent.MinY + extent.Height * (0.02 + 0.9 * random.NextDouble()));
}

/// <summary>Keeps the texts that are written on a map.</summary>
internal sealed class WritingCanvas : IMapCanvas
{
    private readonly List<MapText> _texts = [];

    public ImmutableArray<MapText> Texts => [.. _texts];

    public static ImmutableArray<MapText> TextsOf(MapSheet sheet)
    {
        WritingCanvas canvas = new();
        sheet.Draw(canvas);
        return canvas.Texts;
    }

    public void Layer(string name)
    {
    }

    public void Fill(Shape shape, SKColor color)
    {
    }

    public void Stroke(Shape shape, Pen pen)
    {
    }

    public void Write(MapText text) => _texts.Add(text);

    public void Clipped(Shape within, Action draw) => draw();
}
