using System.Globalization;
using DocumentFormat.OpenXml;
using DocumentFormat.OpenXml.Wordprocessing;

namespace CaptureZone.Outputs.Memos.Word;

/// <summary>The styles of the Word memo; the format has none of its own.</summary>
internal static class WordStyles
{
    public const string Normal = "Normal";
    public const string Title = "Title";
    public const string Caption = "Caption";
    public const string Bullet = "ListBullet";
    public const string Verdict = "Verdict";
    public const string Warning = "Warning";
    public const string Caution = "Caution";
    public const string Cell = "TableText";
    public const string HeaderCell = "TableHeader";
    public const string Label = "FormLabel";
    public const string Value = "FormValue";
    public const string Gap = "Gap";
    public const string Code = "Code";
    public const string Picture = "Picture";
    public const string Header = "Header";
    public const string Footer = "Footer";

    /// <summary>Dark blue of headings and rules; black enough in grey print.</summary>
    public const string Ink = "123F6B";

    /// <summary>Pale ground of header rows and of the verdict.</summary>
    public const string Ground = "E9EEF3";

    /// <summary>Pale blue of the rules between a table's rows.</summary>
    public const string Pale = "B9C6D2";

    /// <summary>Dark orange at the side of a warning; told from the verdict by its text and its place as well.</summary>
    private const string Alert = "A4480F";

    /// <summary>On every machine with an office program, or with a font of the same widths.</summary>
    private const string Sans = "Arial";

    private const string Mono = "Courier New";

    /// <summary>The style's id of a heading.</summary>
    /// <param name="level">Its level.</param>
    public static string Heading(int level) => level == 1 ? "Heading1" : "Heading2";

    /// <summary>All styles.</summary>
    public static Styles All() => new(
        Defaults(),
        Paragraph(Normal, "Normal", 20, Space(0, 120), isDefault: true),
        Outlined("Title", "Title", 32, Space(0, 160), null),
        Outlined("Heading1", "heading 1", 26, Space(320, 100), 0),
        Outlined("Heading2", "heading 2", 21, Space(200, 80), 1),
        Paragraph(Caption, "caption", 18, [new KeepNext(), new KeepLines(), .. Space(180, 80)], isBold: true),
        Paragraph(Bullet, "List Bullet", 20, Bulleted()),
        Paragraph(Verdict, "Verdict", 21, Boxed(Ink, Ground), isBold: true),
        Paragraph(Warning, "Warning", 20, Boxed(Alert, null), isBold: true),
        Paragraph(Caution, "Caution", 18, Space(60, 160), isItalic: true),
        Paragraph(Cell, "Table Text", 17, Space(20, 20)),
        Paragraph(HeaderCell, "Table Header", 17, [new KeepNext(), .. Space(30, 30)], isBold: true),
        Paragraph(Label, "Form Label", 19, Space(20, 20), isBold: true),
        Paragraph(Value, "Form Value", 19, Space(20, 20)),
        Paragraph(Gap, "Gap", 8, Space(0, 60)),
        Paragraph(Code, "Code", 14, Space(0, 0), font: Mono),
        Paragraph(Picture, "Picture", 20, [new KeepNext(), .. Space(120, 60), new Justification { Val = JustificationValues.Center }]),
        Paragraph(Header, "header", 15, Space(0, 0)),
        Paragraph(Footer, "footer", 15, Space(0, 0)));

    private static DocDefaults Defaults() => new(
        new RunPropertiesDefault(new RunPropertiesBaseStyle(
            Fonts(Sans), new FontSize { Val = "20" }, new FontSizeComplexScript { Val = "20" }, new Languages { Val = "en-US" })),
        new ParagraphPropertiesDefault(new ParagraphPropertiesBaseStyle(new WidowControl())));

    private static Style Outlined(string id, string name, int halfPoints, OpenXmlElement[] space, int? level) => Paragraph(
        id,
        name,
        halfPoints,
        [
            new KeepNext(),
            new KeepLines(),
            .. space,
            .. level is { } value ? [new OutlineLevel { Val = value }] : Array.Empty<OpenXmlElement>(),
        ],
        isBold: true,
        colour: Ink);

    /// <summary>One paragraph style; lengths in half points.</summary>
    private static Style Paragraph(
        string id,
        string name,
        int halfPoints,
        OpenXmlElement[] layout,
        bool isDefault = false,
        bool isBold = false,
        bool isItalic = false,
        string font = Sans,
        string? colour = null)
    {
        Style style = new()
        {
            Type = StyleValues.Paragraph,
            StyleId = id,
            Default = isDefault ? true : null,
            CustomStyle = IsOwn(id) ? true : null,
        };
        style.Append(new StyleName { Val = name });
        if (!isDefault)
        {
            style.Append(new BasedOn { Val = Normal });
        }

        style.Append(new PrimaryStyle(), new StyleParagraphProperties(layout), Look(halfPoints, isBold, isItalic, font, colour));
        return style;
    }

    private static bool IsOwn(string id) =>
        id is Verdict or Warning or Caution or Cell or HeaderCell or Label or Value or Gap or Code or Picture;

    private static StyleRunProperties Look(int halfPoints, bool isBold, bool isItalic, string font, string? colour)
    {
        StyleRunProperties look = new(Fonts(font));
        if (isBold)
        {
            look.Append(new Bold());
        }

        if (isItalic)
        {
            look.Append(new Italic());
        }

        if (colour is not null)
        {
            look.Append(new Color { Val = colour });
        }

        string size = halfPoints.ToString(CultureInfo.InvariantCulture);
        look.Append(new FontSize { Val = size }, new FontSizeComplexScript { Val = size });
        return look;
    }

    private static RunFonts Fonts(string name) => new() { Ascii = name, HighAnsi = name, EastAsia = name, ComplexScript = name };

    /// <summary>Space before and after, twentieths of a point.</summary>
    private static OpenXmlElement[] Space(int before, int after) => [WordText.Space(before, after)];

    private static OpenXmlElement[] Bulleted() =>
    [
        new NumberingProperties(new NumberingLevelReference { Val = 0 }, new NumberingId { Val = WordNumbering.Bullets }),
        .. Space(0, 60),
    ];

    private static OpenXmlElement[] Boxed(string edge, string? ground)
    {
        List<OpenXmlElement> layout =
        [
            new KeepLines(),
            new ParagraphBorders(new LeftBorder { Val = BorderValues.Single, Size = 24, Space = 8, Color = edge }),
        ];
        if (ground is not null)
        {
            layout.Add(new Shading { Val = ShadingPatternValues.Clear, Color = "auto", Fill = ground });
        }

        layout.AddRange(Space(80, 120));
        layout.Add(new Indentation { Left = "200" });
        return [.. layout];
    }
}
