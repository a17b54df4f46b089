package perveance.report;

import java.awt.color.ColorSpace;
import java.awt.color.ICC_Profile;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.Calendar;
import javax.xml.transform.TransformerException;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDDocumentInformation;
import org.apache.pdfbox.pdmodel.common.PDMetadata;
import org.apache.pdfbox.pdmodel.graphics.color.PDOutputIntent;
import org.apache.pdfbox.pdmodel.interactive.viewerpreferences.PDViewerPreferences;
import org.apache.xmpbox.XMPMetadata;
import org.apache.xmpbox.schema.AdobePDFSchema;
import org.apache.xmpbox.schema.DublinCoreSchema;
import org.apache.xmpbox.schema.PDFAIdentificationSchema;
import org.apache.xmpbox.schema.XMPBasicSchema;
import org.apache.xmpbox.type.BadFieldValueException;
import org.apache.xmpbox.xml.XmpSerializer;

/** Title, subject, language and the marks of PDF/A-2b (ISO 19005-2). */
final class Archive {
  private static final String PROGRAM = "Perveance";

  private Archive() {}

  static void describe(PDDocument document, String title, String subject, Calendar date)
      throws IOException {
    PDDocumentInformation information = document.getDocumentInformation();
    information.setTitle(title);
    information.setSubject(subject);
    information.setCreator(PROGRAM);
    information.setProducer(PROGRAM);
    information.setCreationDate(date);
    information.setModificationDate(date);
    document.getDocumentCatalog().setLanguage("en-GB");
    PDViewerPreferences preferences =
        new PDViewerPreferences(new org.apache.pdfbox.cos.COSDictionary());
    preferences.setDisplayDocTitle(true);
    document.getDocumentCatalog().setViewerPreferences(preferences);
    intent(document);
    document.getDocumentCatalog().setMetadata(metadata(document, title, subject, date));
  }

  private static void intent(PDDocument document) throws IOException {
    byte[] profile = ICC_Profile.getInstance(ColorSpace.CS_sRGB).getData();
    PDOutputIntent intent = new PDOutputIntent(document, new ByteArrayInputStream(profile));
    String name = "sRGB IEC61966-2.1";
    intent.setInfo(name);
    intent.setOutputCondition(name);
    intent.setOutputConditionIdentifier(name);
    intent.setRegistryName("http://www.color.org");
    document.getDocumentCatalog().addOutputIntent(intent);
  }

  private static PDMetadata metadata(
      PDDocument document, String title, String subject, Calendar date) throws IOException {
    XMPMetadata xmp = XMPMetadata.createXMPMetadata();
    DublinCoreSchema core = xmp.createAndAddDublinCoreSchema();
    core.setTitle(title);
    core.setDescription(subject);
    core.addLanguage("en-GB");
    XMPBasicSchema basic = xmp.createAndAddXMPBasicSchema();
    basic.setCreatorTool(PROGRAM);
    basic.setCreateDate(date);
    basic.setModifyDate(date);
    AdobePDFSchema adobe = xmp.createAndAddAdobePDFSchema();
    adobe.setProducer(PROGRAM);
    try {
      PDFAIdentificationSchema archive = xmp.createAndAddPDFAIdentificationSchema();
      archive.setPart(2);
      archive.setConformance("B");
    } catch (BadFieldValueException e) {
      throw new IllegalStateException("PDF/A marks refused", e);
    }
    try (ByteArrayOutputStream out = new ByteArrayOutputStream()) {
      new XmpSerializer().serialize(xmp, out, true);
      PDMetadata metadata = new PDMetadata(document);
      metadata.importXMPMetadata(out.toByteArray());
      return metadata;
    } catch (TransformerException e) {
      throw new IOException("cannot write the document's metadata", e);
    }
  }
}
