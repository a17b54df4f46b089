package perveance.cli;

import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import perveance.engine.base.BadInputException;
import perveance.engine.device.Capacitances;
import perveance.engine.device.Evidence;
import perveance.engine.device.Heater;
import perveance.engine.device.fit.Filament;
import perveance.engine.device.fit.FitConditions;
import perveance.engine.device.fit.FitResult;
import perveance.engine.device.fit.Heating;
import perveance.engine.device.fit.LawFit;
import perveance.engine.device.fit.LawFitter;
import perveance.engine.device.fit.PentodeFitter;
import perveance.engine.device.fit.RectifierFitter;
import perveance.engine.device.fit.TriodeFitter;
import perveance.files.device.DeviceReader;
import perveance.files.device.DeviceSheet;
import perveance.files.device.DeviceWriter;
import perveance.files.readings.CurveReadings;
import perveance.files.readings.CurveReadingsReader;
import perveance.files.toml.SourceText;

/**
 * What a fit starts from.
 *
 * @param sheet what is published or measured
 * @param deviceFile the device file that it stands in; empty when the evidence is one person's
 *     readings rather than publications
 */
record FitInput(DeviceSheet sheet, Optional<SourceText> deviceFile) {
  static FitInput read(Path file) throws BadInputException {
    SourceText source = SourceText.read(file);
    if (source.text().contains("perveance_device")) {
      return new FitInput(DeviceReader.readSheet(source), Optional.of(source));
    }
    CurveReadings readings = CurveReadingsReader.read(source);
    String name = file.getFileName().toString().replaceFirst("\\.[^.]*$", "");
    return new FitInput(measured(readings, name), Optional.empty());
  }

  private static DeviceSheet measured(CurveReadings readings, String name) {
    return new DeviceSheet(
        readings.device().map(d -> d + " (measured)").orElse(name),
        List.of(),
        kind(readings.evidence()),
        1,
        "",
        Map.of(),
        List.of(),
        List.of(),
        Capacitances.NONE,
        readings.evidence(),
        List.of("Fitted to readings of one valve; no ratings known."),
        Optional.empty());
  }

  private static String kind(List<Evidence> evidence) {
    if (evidence.stream().anyMatch(e -> e.screenVoltage().isPresent())) {
      return "pentode";
    }
    return evidence.stream().allMatch(e -> e.gridVoltage().isEmpty()) ? "rectifier" : "triode";
  }

  boolean readings() {
    return deviceFile.isEmpty();
  }

  /** A device file with the law: everything that stood in one before stays as it was written. */
  String text(LawFit fit) {
    return deviceFile
        .map(file -> DeviceWriter.update(file, fit.law(), fit.summary(), fit.validity()))
        .orElseGet(() -> DeviceWriter.fresh(sheet, fit.law(), fit.summary(), fit.validity()));
  }

  FitResult fit() {
    LawFitter fitter =
        switch (sheet.kind()) {
          case "pentode" -> new PentodeFitter(false);
          case "beam" -> new PentodeFitter(true);
          case "rectifier" -> new RectifierFitter();
          default -> new TriodeFitter();
        };
    FitConditions conditions = FitConditions.USUAL;
    Optional<Heater> filament = sheet.heaters().stream().filter(Heater::directlyHeated).findFirst();
    if (filament.isPresent()) {
      conditions = conditions.with(new Filament(filament.get().voltage(), Heating.ALTERNATING));
    }
    return fitter.fit(sheet.evidence(), readings() ? conditions.forReadings() : conditions);
  }
}
