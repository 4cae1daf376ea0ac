using DocumentFormat.OpenXml.Wordprocessing;
using W = DocumentFormat.OpenXml.Wordprocessing;

namespace CaptureZone.Outputs.Memos.Word;

/// <summary>The bullet list of the Word memo.</summary>
internal static class WordNumbering
{
    /// <summary>Number of the bullet list.</summary>
    public const int Bullets = 1;

    /// <summary>The definition of the bullets.</summary>
    public static W.Numbering All() => new(
        new AbstractNum(
            new MultiLevelType { Val = MultiLevelValues.SingleLevel },
            new Level(
                new StartNumberingValue { Val = 1 },
                new NumberingFormat { Val = NumberFormatValues.Bullet },
                new LevelText { Val = "\u2022" },
                new LevelJustification { Val = LevelJustificationValues.Left },
                new PreviousParagraphProperties(new Indentation { Left = "360", Hanging = "240" }))
            { LevelIndex = 0 })
        { AbstractNumberId = 0 },
        new NumberingInstance(new AbstractNumId { Val = 0 }) { NumberID = Bullets });
}
