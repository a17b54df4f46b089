package perveance.accuracy;

import java.util.List;
import java.util.Optional;
import perveance.engine.device.Evidence;
import perveance.engine.device.Heater;
import perveance.engine.device.fit.Filament;
import perveance.engine.device.fit.FitConditions;
import perveance.engine.device.fit.FitResult;
import perveance.engine.device.fit.Heating;
import perveance.engine.device.fit.LawFitter;
import perveance.engine.device.fit.PentodeFitter;
import perveance.engine.device.fit.RectifierFitter;
import perveance.engine.device.fit.TriodeFitter;

/**
 * How the laws of the library are fitted: filaments with alternating current, all else as usual.
 */
final class LibraryFits {
  private LibraryFits() {}

  /** Fits the law of a kind of device to evidence. */
  static FitResult fit(String kind, List<Heater> heaters, List<Evidence> evidence) {
    LawFitter fitter =
        switch (kind) {
          case "triode" -> new TriodeFitter();
          case "rectifier" -> new RectifierFitter();
          default -> new PentodeFitter(kind.equals("beam"));
        };
    Optional<Heater> filament = heaters.stream().filter(Heater::directlyHeated).findFirst();
    FitConditions conditions =
        filament
            .map(f -> FitConditions.USUAL.with(new Filament(f.voltage(), Heating.ALTERNATING)))
            .orElse(FitConditions.USUAL);
    return fitter.fit(evidence, conditions);
  }
}
