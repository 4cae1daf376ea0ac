using SkiaSharp;

namespace CaptureZone.Outputs.Maps;

/// <summary>Colours, weights and sizes of maps; lengths in units of the sheet. <c>docs/look.md</c> gives the reasons.</summary>
internal static class Look
{
    public const float SheetWidth = 2600;
    public const float SheetMargin = 60;

    public const float TitleSize = 68;
    public const float HeadSize = 42;
    public const float NameSize = 38;
    public const float BodySize = 36;
    public const float SmallSize = 32;
    public const float LongestLeader = 1000;
    public const float HaloWidth = 10;

    public const float ContainmentGlowWidth = 28;
    public const byte ContainmentGlowAlpha = 77;
    public const float HatchSpacing = 22;
    public const float SymbolRadius = 17;
    public const float ShortestArrow = 34;
    public const float LongestArrow = 84;

    public static readonly SKColor Paper = SKColor.Parse("#FFFFFF");
    public static readonly SKColor Ink = SKColor.Parse("#1C2733");
    public static readonly SKColor SoftInk = SKColor.Parse("#4A5563");
    public static readonly SKColor Containment = SKColor.Parse("#123F6B");
    public static readonly SKColor ContainmentGlow = SKColor.Parse("#2F7FC1");
    public static readonly SKColor ContainmentTint1 = SKColor.Parse("#E9F2F9");
    public static readonly SKColor ContainmentTint2 = SKColor.Parse("#C5DDF0");
    public static readonly SKColor ContainmentTint3 = SKColor.Parse("#A1C9E7");
    public static readonly SKColor Supply = SKColor.Parse("#6E4F0C");
    public static readonly SKColor SupplyTint1 = SKColor.Parse("#F3E4C3");
    public static readonly SKColor SupplyTint2 = SKColor.Parse("#E9CC8A");
    public static readonly SKColor SupplyTint3 = SKColor.Parse("#DEB352");
    public static readonly SKColor TravelTime = SKColor.Parse("#0A6650");
    public static readonly SKColor Plume = SKColor.Parse("#A6321B");
    public static readonly SKColor Head = SKColor.Parse("#2E6A8C");
    public static readonly SKColor Dividing = SKColor.Parse("#4B3B57");
    public static readonly SKColor Arrow = SKColor.Parse("#76828E");
    public static readonly SKColor Backdrop = SKColor.Parse("#85807A");
    public static readonly SKColor Grid = SKColor.Parse("#D5D9DD");

    public static readonly Pen FramePen = new(Ink, 4);
    public static readonly Pen TickPen = new(SoftInk, 3);
    public static readonly Pen GridPen = new(Grid, 3);
    public static readonly Pen LeaderPen = new(SoftInk, 2.5f);
    public static readonly Pen JointPen = new(Containment, 8);
    public static readonly Pen GlowPen = new(ContainmentGlow.WithAlpha(ContainmentGlowAlpha), 2 * ContainmentGlowWidth);
    public static readonly Pen ContainmentZonePen = new(Containment, 3);
    public static readonly Pen SupplyZonePen = new(Supply, 3);
    public static readonly Pen PlumePen = new(Plume, 5);
    public static readonly Pen HatchPen = new(Plume, 2.5f);
    public static readonly Pen PlumePathPen = new(Plume, 2.5f, 10, 7);
    public static readonly Pen HeadPen = new(Head, 2.5f);
    public static readonly Pen IndexHeadPen = new(Head, 4);
    public static readonly Pen DestinationsPen = new(Dividing, 3.5f, 22, 8, 4, 8);
    public static readonly Pen OriginsPen = new(Dividing, 3.5f, 4, 8);
    public static readonly Pen ArrowPen = new(Arrow, 3.5f);
    public static readonly Pen GapPen = new(Paper, 16);
    public static readonly Pen BackdropPen = new(Backdrop, 3, 18, 10);

    private static readonly Pen[] TravelTimePens =
        [new(TravelTime, 4), new(TravelTime, 4, 28, 12), new(TravelTime, 4, 14, 9), new(TravelTime, 4, 4, 8)];

    /// <summary>Every colour that fills places: all of the above, and the glow over paper and tints.</summary>
    public static IEnumerable<SKColor> FlatColors =>
    [
        Paper, Ink, SoftInk, Containment, ContainmentTint1, ContainmentTint2, ContainmentTint3, Supply, SupplyTint1, SupplyTint2,
        SupplyTint3, TravelTime, Plume, Head, Dividing, Arrow, Backdrop, Grid, .. Tints(true).Prepend(Paper).Select(Glowing),
    ];

    /// <summary>The pen of a travel time.</summary>
    /// <param name="index">The time's place in the questions.</param>
    public static Pen TravelTimePen(int index) => TravelTimePens[index % TravelTimePens.Length];

    /// <summary>The pen that breaks the frame where a zone leaves it.</summary>
    /// <param name="color">Colour of the zone's edge.</param>
    public static Pen OpenPen(SKColor color) => new(color, 14, 26, 16);

    /// <summary>The tints of containment wells' zones or of all others, in order of use.</summary>
    /// <param name="containment">Whether they are containment wells'.</param>
    public static SKColor[] Tints(bool containment) => containment
        ? [ContainmentTint1, ContainmentTint2, ContainmentTint3]
        : [SupplyTint1, SupplyTint2, SupplyTint3];

    private static SKColor Glowing(SKColor below)
    {
        SKColor glow = ContainmentGlow;
        return new(Mixed(glow.Red, below.Red), Mixed(glow.Green, below.Green), Mixed(glow.Blue, below.Blue));

        static byte Mixed(byte glow, byte below) =>
            (byte)((glow * ContainmentGlowAlpha + below * (byte.MaxValue - ContainmentGlowAlpha)) / byte.MaxValue);
    }
}
