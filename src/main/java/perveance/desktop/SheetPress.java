package perveance.desktop;

import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import perveance.desktop.viewmodel.DocumentException;
import perveance.desktop.viewmodel.Press;
import perveance.desktop.viewmodel.Settings;
import perveance.engine.analysis.ChassisAnswer;
import perveance.report.BuildSheet;
import perveance.report.PaperSize;
import perveance.report.SheetOptions;

/** Prints the sheet by the same hand as the command line. */
final class SheetPress implements Press {
  @Override
  public byte[] sheet(ChassisAnswer answer, Settings settings) {
    String version =
        Optional.ofNullable(SheetPress.class.getPackage().getImplementationVersion())
            .orElse("development");
    return new BuildSheet(
            new SheetOptions(
                settings.letter() ? PaperSize.LETTER : PaperSize.A4,
                settings.vocabulary(),
                settings.zigzag(),
                LocalDate.now(java.time.ZoneId.systemDefault()),
                version))
        .render(answer);
  }

  @Override
  public List<String> printers() {
    return Printers.names();
  }

  @Override
  public void print(byte[] sheet, String printer, Settings settings) throws DocumentException {
    Printers.print(sheet, printer, settings.letter());
  }
}
