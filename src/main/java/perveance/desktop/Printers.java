package perveance.desktop;

import java.util.List;
import java.util.stream.Stream;
import javax.print.Doc;
import javax.print.DocFlavor;
import javax.print.DocPrintJob;
import javax.print.PrintException;
import javax.print.PrintService;
import javax.print.PrintServiceLookup;
import javax.print.SimpleDoc;
import javax.print.attribute.HashPrintRequestAttributeSet;
import javax.print.attribute.PrintRequestAttributeSet;
import javax.print.attribute.standard.JobName;
import javax.print.attribute.standard.MediaSizeName;
import perveance.desktop.viewmodel.DocumentException;

/** Printers that take the sheet as it is, so that paper shows what the file shows. */
final class Printers {
  private static final DocFlavor SHEET = DocFlavor.BYTE_ARRAY.PDF;

  private Printers() {}

  private static Stream<PrintService> services() {
    return Stream.of(PrintServiceLookup.lookupPrintServices(SHEET, null));
  }

  static List<String> names() {
    return services().map(PrintService::getName).toList();
  }

  static void print(byte[] sheet, String printer, boolean letter) throws DocumentException {
    DocPrintJob job =
        services()
            .filter(s -> s.getName().equals(printer))
            .findFirst()
            .map(PrintService::createPrintJob)
            .orElseThrow(() -> refused("the printer \u201c" + printer + "\u201d is gone"));
    PrintRequestAttributeSet wishes = new HashPrintRequestAttributeSet();
    wishes.add(new JobName("Build sheet", null));
    wishes.add(letter ? MediaSizeName.NA_LETTER : MediaSizeName.ISO_A4);
    Doc doc = new SimpleDoc(sheet, SHEET, null);
    try {
      job.print(doc, wishes);
    } catch (PrintException e) {
      throw refused(String.valueOf(e.getMessage()));
    }
  }

  private static DocumentException refused(String why) {
    return new DocumentException(
        "The sheet was not printed.",
        why,
        "Look whether the printer is switched on, or write the sheet as a PDF file and print"
            + " that.");
  }
}
