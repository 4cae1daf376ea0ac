using System.Collections.Immutable;
using CaptureZone.Outputs.Text;
using NetTopologySuite.Geometries;
using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>A map with everything in its place, ready to be drawn on any canvas.</summary>
internal sealed class MapSheet
{
    /// <summary>Frames at least this many times as wide as high have the panel below.</summary>
    private const double WideFrame = 1.2;

    /// <summary>The most slender frame that is shown, width over height.</summary>
    private const double Slenderest = 0.62;

    /// <summary>The widest frame that is shown, width over height.</summary>
    private const double Widest = 2.6;

    private const float PanelGap = 50;
    private const float SidePanelWidth = 700;
    private const int ColumnsBelow = 3;

    /// <summary>Labels keep this far from the frame, units of the sheet.</summary>
    private const float FrameClearance = 20;

    private static readonly TextStyle TitleStyle = new(Look.TitleSize, Look.Ink, Bold: true);
    private static readonly TextStyle SubtitleStyle = new(Look.HeadSize, Look.SoftInk);
    private static readonly TextStyle CautionStyle = new(Look.BodySize, Look.Ink, Bold: true);

    private readonly Report _report;
    private readonly PlanFrame _frame;
    private readonly OpenFrameLayer _open;
    private readonly ImmutableArray<IMapLayer> _layers;
    private readonly ImmutableArray<(PanelBlock Block, SKPoint At)> _panel;
    private readonly ImmutableArray<string> _caution;
    private readonly float _cautionTop;

    /// <summary>Lays the map out.</summary>
    /// <param name="report">Document and answers.</param>
    public MapSheet(Report report)
    {
        _report = report;
        Envelope frame = Shown(report.Answers.Extent);
        bool below = frame.Width >= WideFrame * frame.Height;
        float left = Look.SheetMargin + PlanFrame.Room, right = Look.SheetWidth - Look.SheetMargin;
        float planRight = below ? right : right - SidePanelWidth - PanelGap;
        View = new PlanView(frame, left, TitleBottom, planRight - left);
        MapScene scene = new(report, View);
        _frame = new PlanFrame(report.Site, View);

        ZoneLayer zones = new(scene);
        BackdropLayer backdrop = new(scene);
        ContourLayer contours = new(scene);
        PathLayer paths = new(scene);
        TravelTimeLayer times = new(scene);
        PlumeLayer plumes = new(scene);
        JointZoneLayer joint = new(scene);
        _open = new OpenFrameLayer(scene);
        StagnationLayer stagnation = new(scene);
        WellLayer wells = new(scene);
        IMapLayer[] labelled = [wells, plumes, _open, times, backdrop, contours];
        Placement = LabelPlacement.Of(
            SKRect.Inflate(View.Area, -FrameClearance, -FrameClearance),
            [.. wells.Symbols, .. stagnation.Symbols, .. backdrop.Symbols],
            [.. joint.HeavyLines, .. plumes.HeavyLines],
            labelled.SelectMany(layer => layer.Labels));
        ArrowLayer arrows = new(scene, Placement.Taken);
        _layers = [zones, backdrop, contours, arrows, plumes, paths, times, joint, stagnation, wells];

        IMapLayer[] explained = [wells, joint, zones, times, plumes, stagnation, paths, contours, arrows, backdrop];
        LegendItem[] legend = [.. explained.SelectMany(layer => layer.Legend)];
        SKRect panel = below
            ? new(left, View.Area.Bottom + PlanFrame.Room + PanelGap, right, 0)
            : new(planRight + PanelGap, TitleBottom, right, 0);
        _panel = [.. Panel(scene, legend, panel, below ? ColumnsBelow : 1)];
        float bottom = MathF.Max(
            View.Area.Bottom + PlanFrame.Room, _panel.Max(piece => piece.At.Y + piece.Block.Height));
        _cautionTop = bottom + PanelGap;
        _caution = Lettering.Wrapped(Caution.Text, CautionStyle, Look.SheetWidth - 2 * Look.SheetMargin);
        Height = (int)MathF.Ceiling(_cautionTop + _caution.Length * CautionLine + Look.SheetMargin);
    }

    /// <summary>Height of the sheet.</summary>
    public int Height { get; }

    /// <summary>Where places lie on the sheet.</summary>
    public PlanView View { get; }

    /// <summary>The labels on the plan.</summary>
    public LabelPlacement Placement { get; }

    private static float TitleBottom => Look.SheetMargin + (Look.TitleSize + Look.HeadSize) * Lettering.LineHeight + 24;

    private static float CautionLine => Look.BodySize * Lettering.LineHeight;

    /// <summary>Draws everything; the one routine for every format.</summary>
    /// <param name="canvas">Where to.</param>
    public void Draw(IMapCanvas canvas)
    {
        canvas.Layer("sheet");
        DrawTitle(canvas);
        canvas.Clipped(Shape.Rectangle(View.Area), () => _frame.DrawCrosses(canvas));
        foreach (IMapLayer layer in _layers)
        {
            canvas.Layer(layer.Name);
            canvas.Clipped(Shape.Rectangle(View.Area), () => layer.Draw(canvas));
        }

        canvas.Layer("labels");
        Placement.Draw(canvas);
        canvas.Layer("frame");
        _frame.Draw(canvas);
        canvas.Layer(_open.Name);
        _open.Draw(canvas);
        canvas.Layer("legend");
        foreach ((PanelBlock block, SKPoint at) in _panel)
        {
            block.Draw(canvas, at);
        }

        canvas.Layer("caution");
        DrawCaution(canvas);
    }

    /// <summary>The extent, grown about its middle when it is too slender to read.</summary>
    private static Envelope Shown(Envelope extent)
    {
        double width = Math.Max(extent.Width, Slenderest * extent.Height), height = Math.Max(extent.Height, extent.Width / Widest);
        Envelope shown = extent.Copy();
        shown.ExpandBy((width - extent.Width) / 2, (height - extent.Height) / 2);
        return shown;
    }

    /// <summary>The blocks of legend and notes in their places; with several columns the notes have the last.</summary>
    private IEnumerable<(PanelBlock Block, SKPoint At)> Panel(MapScene scene, LegendItem[] legend, SKRect area, int columns)
    {
        float width = (area.Width - (columns - 1) * PanelGap) / columns;
        PanelBlock[] items = [PanelBlock.Heading("Legend"), .. legend.Select(item => PanelBlock.Of(item, width))];
        float perColumn = items.Sum(block => block.Height) / Math.Max(1, columns - 1);
        SKPoint at = area.Location;
        foreach (PanelBlock block in items)
        {
            yield return (block, at);
            at.Y += block.Height;
            if (columns > 1 && at.Y - area.Top >= perColumn)
            {
                at = new(at.X + width + PanelGap, area.Top);
            }
        }

        at = columns > 1 ? new(area.Right - width, area.Top) : new(at.X, at.Y + PanelGap);
        foreach (PanelBlock block in (PanelBlock[])[ScaleBlock.Of(View, width), .. Notes(scene).Select(note => PanelBlock.Note(note, width))])
        {
            yield return (block, at);
            at.Y += block.Height;
        }
    }

    private IEnumerable<string> Notes(MapScene scene) => MapNotes.Of(scene, Placement);

    private void DrawTitle(IMapCanvas canvas)
    {
        float width = Look.SheetWidth - 2 * Look.SheetMargin, left = Look.SheetMargin;
        float line = Look.TitleSize * Lettering.LineHeight;
        canvas.Write(MapText.From(Lettering.Fitted(_report.Site.Title, TitleStyle, width), left, Look.SheetMargin + line / 2, TitleStyle));
        canvas.Write(MapText.From(
            "Predicted heads and zones", left, Look.SheetMargin + line + Look.HeadSize * Lettering.LineHeight / 2, SubtitleStyle));
    }

    private void DrawCaution(IMapCanvas canvas)
    {
        float left = Look.SheetMargin, right = Look.SheetWidth - Look.SheetMargin, rule = _cautionTop - PanelGap / 2;
        canvas.Stroke(Shape.Line(new(left, rule), new(right, rule)), Look.TickPen);
        for (int i = 0; i < _caution.Length; i++)
        {
            canvas.Write(MapText.From(_caution[i], left, _cautionTop + (i + 0.5f) * CautionLine, CautionStyle));
        }
    }
}
