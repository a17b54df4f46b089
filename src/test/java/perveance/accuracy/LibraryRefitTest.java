package perveance.accuracy;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import perveance.engine.base.BadInputException;
import perveance.engine.device.Device;
import perveance.engine.device.LawParameter;
import perveance.engine.device.fit.FitResult;
import perveance.engine.device.fit.LawFit;
import perveance.files.device.DeviceReader;
import perveance.files.device.DeviceSheet;
import perveance.files.device.DeviceWriter;
import perveance.files.toml.SourceText;

/**
 * Fits every law of the library again from the evidence in its file and compares. With {@code
 * -Dperveance.refit=write} the files' laws are written anew instead:
 *
 * <pre>{@code mvn -q test -Dtest=LibraryRefitTest -Dperveance.refit=write}</pre>
 */
class LibraryRefitTest {
  private static final Path FOLDER = Path.of("device-curves");
  private static final boolean WRITE = "write".equals(System.getProperty("perveance.refit"));

  static List<Path> all() throws IOException {
    try (Stream<Path> files = Files.list(FOLDER)) {
      return files.filter(file -> file.toString().endsWith(".toml")).sorted().toList();
    }
  }

  /**
   * Pinned: the law in the file is what its evidence gives. Files keep six figures; 1e-5 of the
   * value (or of the unit for numbers near zero) leaves room for their rounding only.
   */
  @ParameterizedTest
  @MethodSource("all")
  @Tag("pinned")
  void theLawIsWhatTheEvidenceGives(Path file) throws IOException, BadInputException {
    String text = Files.readString(file);
    DeviceSheet sheet = DeviceReader.readSheet(SourceText.of(file.toString(), text));
    FitResult result = LibraryFits.fit(sheet.kind(), sheet.heaters(), sheet.evidence());
    LawFit fit = assertInstanceOf(FitResult.Fitted.class, result, () -> file + ": " + result).fit();
    if (WRITE) {
      SourceText source = SourceText.of(file.toString(), text);
      Files.writeString(
          file, DeviceWriter.update(source, fit.law(), fit.summary(), fit.validity()));
      return;
    }
    Device device = DeviceReader.read(SourceText.of(file.toString(), text));
    List<LawParameter> kept = device.law().parameters();
    List<LawParameter> fresh = fit.law().parameters();
    assertEquals(fresh.size(), kept.size());
    for (int i = 0; i < fresh.size(); i++) {
      double expected = fresh.get(i).value();
      assertEquals(
          expected,
          kept.get(i).value(),
          1e-5 * Math.max(Math.abs(expected), fresh.get(i).unit().equals("V") ? 1 : 0),
          sheet.type() + " " + fresh.get(i).key());
    }
    assertEquals(fit.summary().method(), device.fit().method(), sheet.type());
    assertEquals(fit.summary().assumptions(), device.fit().assumptions(), sheet.type());
    assertEquals(fit.summary().worstError(), device.fit().worstError(), 5e-4, sheet.type());
    assertEquals(fit.summary().medianError(), device.fit().medianError(), 5e-4, sheet.type());
  }
}
