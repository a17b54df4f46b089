package perveance.report;

import java.io.IOException;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import perveance.app.wording.Vocabulary;
import perveance.engine.analysis.AnalysisOptions;
import perveance.engine.analysis.ChassisAnalysis;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Progress;
import perveance.engine.stage.Chassis;
import perveance.files.chassis.ChassisReader;
import perveance.files.device.DeviceFiles;

/** Makes answers and sheets for tests. */
final class SheetTrial {
  private SheetTrial() {}

  static ChassisAnswer answer(String example) throws BadInputException {
    DeviceFiles devices = new DeviceFiles(List.of());
    Chassis chassis = new ChassisReader(devices).read(Path.of(example));
    return new ChassisAnalysis(devices)
        .answer(chassis, AnalysisOptions.FULL.withSamples(200), Progress.none());
  }

  static ChassisAnswer retitled(ChassisAnswer answer, Chassis chassis) {
    return new ChassisAnswer(
        chassis,
        answer.supplies(),
        answer.stages(),
        answer.failures(),
        answer.discharges(),
        answer.highestVoltage(),
        answer.chains(),
        answer.findings());
  }

  static SheetOptions options(PaperSize paper, Vocabulary words) {
    return new SheetOptions(paper, words, false, LocalDate.of(2026, 12, 1), "test");
  }

  static String text(byte[] pdf) throws IOException {
    try (PDDocument document = Loader.loadPDF(pdf)) {
      return new PDFTextStripper().getText(document);
    }
  }
}
