using System.Text;
using System.Xml;
using System.Xml.Linq;
using DocumentFormat.OpenXml;
using DocumentFormat.OpenXml.Packaging;
using DocumentFormat.OpenXml.Wordprocessing;

namespace CaptureZone.Outputs.Memos.Word;

/// <summary>Writes a memo as a Word document (Office Open XML, ECMA-376): the same bytes for the same memo and picture.</summary>
public static class WordWriter
{
    private const string DocumentId = "rId1";
    private const string PropertiesId = "rId2";
    private const string StylesId = "rIdStyles";
    private const string NumberingId = "rIdNumbering";
    private const string SettingsId = "rIdSettings";
    private const string HeaderId = "rIdHeader";
    private const string FooterId = "rIdFooter";
    private const string PictureId = "rIdPicture";

    /// <summary>The document's bytes.</summary>
    /// <param name="memo">The memo.</param>
    /// <param name="mapPng">The picture of its figure.</param>
    public static byte[] Write(Memo memo, byte[] mapPng)
    {
        using MemoryStream package = new();
        using (var document = WordprocessingDocument.Create(package, WordprocessingDocumentType.Document))
        {
            MainDocumentPart main = document.AddMainDocumentPart();
            document.ChangeIdOfPart(main, DocumentId);
            WordPage page = WordPage.Of(memo.Paper);
            AddParts(main, memo, mapPng, page);
            main.Document = new(Body(memo, mapPng, page));
            CoreFilePropertiesPart properties = document.AddCoreFilePropertiesPart();
            document.ChangeIdOfPart(properties, PropertiesId);
            AddProperties(properties, memo);
        }

        return ReproducibleZip.Of(package);
    }

    private static Body Body(Memo memo, byte[] mapPng, WordPage page)
    {
        WordBody body = new(page, mapPng, PictureId);
        return new(
        [
            WordText.Paragraph(WordStyles.Title, WordText.Run(memo.Title)),
            .. body.Of(memo.Blocks),
            page.Section(HeaderId, FooterId),
        ]);
    }

    private static void AddParts(MainDocumentPart main, Memo memo, byte[] mapPng, WordPage page)
    {
        main.AddNewPart<StyleDefinitionsPart>(StylesId).Styles = WordStyles.All();
        main.AddNewPart<NumberingDefinitionsPart>(NumberingId).Numbering = WordNumbering.All();
        main.AddNewPart<DocumentSettingsPart>(SettingsId).Settings = Settings();
        main.AddNewPart<HeaderPart>(HeaderId).Header = WordPage.Head(memo.RunningHead);
        main.AddNewPart<FooterPart>(FooterId).Footer = page.Foot(memo.Caution);
        using MemoryStream png = new(mapPng);
        main.AddImagePart(ImagePartType.Png, PictureId).FeedData(png);
    }

    /// <summary>Without this, Word opens the document as one of an older version.</summary>
    private static Settings Settings() => new(new Compatibility(new CompatibilitySetting
    {
        Name = CompatSettingNameValues.CompatibilityMode,
        Uri = "http://schemas.microsoft.com/office/word",
        Val = "15",
    }));

    /// <summary>Title and author, and no times: no clock is read.</summary>
    private static void AddProperties(CoreFilePropertiesPart part, Memo memo)
    {
        XNamespace core = "http://schemas.openxmlformats.org/package/2006/metadata/core-properties";
        XNamespace terms = "http://purl.org/dc/elements/1.1/";
        XElement properties = new(
            core + "coreProperties",
            new XElement(terms + "title", PlainText.OnOneLine(memo.Title)),
            new XElement(terms + "creator", PlainText.OnOneLine(memo.Preparer)));
        using Stream stream = part.GetStream(FileMode.Create);
        using var writer = XmlWriter.Create(stream, new() { Encoding = new UTF8Encoding(false) });
        properties.Save(writer);
    }
}
