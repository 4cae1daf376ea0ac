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
    private const int NoteColumns = 2;

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
        _panel = [.. below ? PanelBelow(scene, legend, left, right) : PanelBeside(scene, legend, left, planRight, right)];
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

    /// <summary>Legend in all columns but the last, which has the notes.</summary>
    private IEnumerable<(PanelBlock Block, SKPoint At)> PanelBelow(MapScene scene, LegendItem[] legend, float left, float right)
    {
        float width = ColumnWidth(right - left, ColumnsBelow);
        SKPoint at = new(left, View.Area.Bottom + PlanFrame.Room + PanelGap), notes = new(right - width, at.Y);
        return [.. Flow(Legend(legend, width), at, width, ColumnsBelow - 1), .. Flow(Notes(scene, width), notes, width, 1)];
    }

    /// <summary>Legend beside the plan, notes below it.</summary>
    private IEnumerable<(PanelBlock Block, SKPoint At)> PanelBeside(
        MapScene scene, LegendItem[] legend, float left, float planRight, float right)
    {
        SKPoint at = new(planRight + PanelGap, TitleBottom), notes = new(left, View.Area.Bottom + PlanFrame.Room + PanelGap / 2);
        float width = ColumnWidth(planRight - left, NoteColumns);
        return [.. Flow(Legend(legend, right - at.X), at, right - at.X, 1), .. Flow(Notes(scene, width), notes, width, NoteColumns)];
    }

    private static float ColumnWidth(float width, int columns) => (width - (columns - 1) * PanelGap) / columns;

    private static PanelBlock[] Legend(LegendItem[] items, float width) =>
        [PanelBlock.Heading("Legend"), .. items.Select(item => PanelBlock.Of(item, width))];

    private PanelBlock[] Notes(MapScene scene, float width) =>
        [ScaleBlock.Of(View, width), .. MapNotes.Of(scene, Placement).Select(note => PanelBlock.Note(note, width))];

    /// <summary>Blocks in columns of about the same height.</summary>
    private static IEnumerable<(PanelBlock Block, SKPoint At)> Flow(PanelBlock[] blocks, SKPoint start, float width, int columns)
    {
        float perColumn = blocks.Sum(block => block.Height) / columns;
        SKPoint at = start;
        foreach (PanelBlock block in blocks)
        {
            yield return (block, at);
            at.Y += block.Height;
            if (columns > 1 && at.Y - start.Y >= perColumn)
            {
                at = new(at.X + width + PanelGap, start.Y);
            }
        }
    }

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
