using DocumentFormat.OpenXml;
using DocumentFormat.OpenXml.Wordprocessing;
using W = DocumentFormat.OpenXml.Wordprocessing;

namespace CaptureZone.Outputs.Memos.Word;

/// <summary>A page of the Word memo; lengths in twentieths of a point.</summary>
/// <param name="Width">Width of the paper.</param>
/// <param name="Height">Height of the paper.</param>
internal sealed record WordPage(int Width, int Height)
{
    /// <summary>20 mm at both sides: tables need the width.</summary>
    private const int Side = 1134;

    /// <summary>25 mm at top and bottom, with room for the running head and the caution.</summary>
    private const int TopAndBottom = 1417;

    /// <summary>12 mm from the paper's edge to the running head and to the caution.</summary>
    private const int Edge = 680;

    /// <summary>Width of the text.</summary>
    public int TextWidth => Width - 2 * Side;

    /// <summary>Height of the text.</summary>
    public int TextHeight => Height - 2 * TopAndBottom;

    /// <summary>The page of a paper: 210 mm x 297 mm, or 8.5 in x 11 in.</summary>
    /// <param name="paper">The paper.</param>
    public static WordPage Of(Paper paper) => paper == Paper.A4 ? new(11906, 16838) : new(12240, 15840);

    /// <summary>The section's properties.</summary>
    /// <param name="headerId">Relationship of the running head.</param>
    /// <param name="footerId">Relationship of the footer.</param>
    public SectionProperties Section(string headerId, string footerId) => new(
        new HeaderReference { Type = HeaderFooterValues.Default, Id = headerId },
        new FooterReference { Type = HeaderFooterValues.Default, Id = footerId },
        new PageSize { Width = (UInt32Value)(uint)Width, Height = (UInt32Value)(uint)Height },
        new PageMargin { Top = TopAndBottom, Bottom = TopAndBottom, Left = Side, Right = Side, Header = Edge, Footer = Edge, Gutter = 0 });

    /// <summary>The running head, ruled off.</summary>
    /// <param name="text">Its text.</param>
    public static Header Head(string text) => new(Ruled<BottomBorder>(WordStyles.Header, WordText.Run(text)));

    /// <summary>The caution and the page's number, ruled off.</summary>
    /// <param name="caution">The caution.</param>
    public Footer Foot(string caution)
    {
        W.Paragraph page = WordText.Paragraph(
            WordStyles.Footer,
            WordText.Run("page "),
            WordText.Field(" PAGE ", 1),
            WordText.Run(" of "),
            WordText.Field(" NUMPAGES ", 1));
        page.ParagraphProperties!.Justification = new() { Val = JustificationValues.Right };
        return new(Ruled<TopBorder>(WordStyles.Footer, WordText.Run(caution)), page);
    }

    private static W.Paragraph Ruled<TBorder>(string style, Run run)
        where TBorder : BorderType, new()
    {
        W.Paragraph paragraph = WordText.Paragraph(style, run);
        paragraph.ParagraphProperties!.ParagraphBorders =
            new(new TBorder { Val = BorderValues.Single, Size = 4, Space = 4, Color = WordStyles.Ink });
        return paragraph;
    }
}
