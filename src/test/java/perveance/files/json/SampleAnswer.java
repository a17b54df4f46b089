package perveance.files.json;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import perveance.engine.analysis.Band;
import perveance.engine.analysis.BiasSupplyAnswer;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.CleanSwing;
import perveance.engine.analysis.DevicePoint;
import perveance.engine.analysis.Discharge;
import perveance.engine.analysis.DrivenAnswer;
import perveance.engine.analysis.ExpectedReading;
import perveance.engine.analysis.InputCapacitor;
import perveance.engine.analysis.Intermodulation;
import perveance.engine.analysis.LargeSignalAnswer;
import perveance.engine.analysis.LimitUse;
import perveance.engine.analysis.PartDuty;
import perveance.engine.analysis.ReactiveAnswer;
import perveance.engine.analysis.Recovery;
import perveance.engine.analysis.SmallSignalAnswer;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.analysis.SupplyAnswer;
import perveance.engine.base.Finding;
import perveance.engine.base.RatingMessage;
import perveance.engine.base.Remedy;
import perveance.engine.base.Severity;
import perveance.engine.base.Unit;
import perveance.engine.device.RatingSystem;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.Drawing;
import perveance.engine.stage.PartRatings;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageCircuit;
import perveance.engine.stage.StageEntry;

/** An answer with a figure of its own in every place; it need not be of a circuit that exists. */
final class SampleAnswer {
  static final Finding FINDING =
      Finding.of(RatingMessage.values()[0], Severity.OVER_LIMIT, "V1a", parts())
          .withValue(1.25, 1, Unit.WATT)
          .withRemedy(Remedy.set("Raise \"anode_load\" to 120k.", "anode_load", "120k"))
          .onPart("V1a.anode_load");

  private SampleAnswer() {}

  private static String[] parts() {
    String[] parts = new String[RatingMessage.values()[0].partCount()];
    java.util.Arrays.fill(parts, "x");
    return parts;
  }

  /** A pentode stage, driven, with every optional figure. */
  static StageAnswer full() {
    DevicePoint point =
        new DevicePoint(
            "V1a",
            "EF86",
            101.5,
            -2,
            OptionalDouble.of(90),
            103.5,
            2,
            0,
            OptionalDouble.of(92),
            1.1999999999999999e-3,
            OptionalDouble.of(3e-4),
            -0.0,
            1.8e-3,
            2.5e6,
            38,
            0.12,
            OptionalDouble.of(0.03),
            Map.of("anodeChassis", band(98, 109), "notAFigure", band(1, 2)),
            Optional.of("screen voltage"));
    return stage(point, Optional.of(driven(0.5)), small(OptionalDouble.of(0.9)));
  }

  /** A triode stage without drive, flat to dc. */
  static StageAnswer bare() {
    DevicePoint point =
        new DevicePoint(
            "V2",
            "12AX7",
            150,
            -1.5,
            OptionalDouble.empty(),
            151.5,
            1.5,
            0,
            OptionalDouble.empty(),
            1e-3,
            OptionalDouble.empty(),
            0,
            1.6e-3,
            Double.POSITIVE_INFINITY,
            100,
            0.15,
            OptionalDouble.empty(),
            Map.of(),
            Optional.empty());
    return stage(point, Optional.empty(), small(OptionalDouble.empty()));
  }

  private static LargeSignalAnswer large(String ref) {
    InputCapacitor capacitor = new InputCapacitor(ref, "input_coupling", 1e-7);
    return new LargeSignalAnswer(
        Optional.of(new Recovery(capacitor, 3, 1.25, 2.2e5, 0.16, 0.045)),
        Optional.of(
            new ReactiveAnswer(
                2e3,
                3,
                4.5,
                2.5,
                440.5,
                0.075,
                List.of(8.75),
                19.5,
                OptionalDouble.of(12),
                false,
                List.of())));
  }

  private static StageAnswer stage(
      DevicePoint point, Optional<DrivenAnswer> driven, SmallSignalAnswer small) {
    StageCircuit circuit =
        new StageCircuit(
            point.ref(),
            Optional.empty(),
            1,
            List.of(),
            List.of(),
            List.of(),
            List.of(),
            Optional.empty(),
            List.of());
    StageCircuit.Part part =
        new StageCircuit.Part(
            point.ref() + ".anode_load",
            "anode_load",
            StageCircuit.PartType.RESISTOR,
            100e3,
            "anode load");
    return new StageAnswer(
        point.ref(),
        "common-cathode",
        circuit,
        new Drawing(1, 1, List.of(), List.of(), List.of()),
        List.of(point),
        List.of(
            new LimitUse(
                point.ref(),
                "anode dissipation",
                "idle",
                0.5,
                1,
                Unit.WATT,
                RatingSystem.DESIGN_CENTRE,
                "a book")),
        small,
        new CleanSwing(
            1.5,
            60,
            CleanSwing.Limit.GRID_CURRENT,
            "V1a",
            1.5,
            CleanSwing.Limit.GRID_CURRENT,
            2.5,
            CleanSwing.Limit.CUT_OFF,
            -62,
            60,
            2,
            OptionalDouble.of(9.5),
            Map.of("inputPeak", band(1.4, 1.6))),
        driven,
        List.of(driven(0.1), driven(0.5)),
        large(point.ref()),
        Optional.of(
            new BiasSupplyAnswer(
                -58, 7.2e-4, -48, -30, OptionalDouble.of(0.25), OptionalDouble.empty())),
        List.of(
            new PartDuty(
                part,
                "R1",
                120,
                0.144,
                0.144,
                300,
                0.9,
                "valve shorted",
                300,
                100e3,
                Optional.of("1 W"),
                PartRatings.NONE)),
        List.of(
            new ExpectedReading(
                1,
                point.ref(),
                "anode",
                "6",
                "n",
                150,
                149,
                140,
                160,
                OptionalDouble.of(300),
                "typical data")),
        Optional.empty(),
        List.of(),
        List.of("grid leak 1M"),
        List.of(FINDING));
  }

  private static SmallSignalAnswer small(OptionalDouble second) {
    return new SmallSignalAnswer(
        -58.25,
        second,
        38e3,
        1.2e-10,
        second.isPresent() ? OptionalDouble.of(7.2) : second,
        OptionalDouble.of(1.1e5),
        Optional.of(new SmallSignalAnswer.Shelf(4.8, 12, 6)),
        OptionalDouble.of(0.7),
        OptionalDouble.of(2e-6),
        List.of(),
        Map.of("gain", band(-62, -54)),
        List.of());
  }

  private static DrivenAnswer driven(double peak) {
    return new DrivenAnswer(
        peak,
        20.5,
        OptionalDouble.of(0.01),
        0.039,
        List.of(0.038, 0.004, 0.0005),
        1.21e-3,
        OptionalDouble.of(3.1e-4),
        List.of(0.12),
        List.of(),
        2e-3,
        Optional.of(new Intermodulation(0.05, 0.02)),
        true);
  }

  private static Band band(double low, double high) {
    return new Band(low, high, List.of());
  }

  static ChassisAnswer chassis() {
    StageEntry entry =
        new StageEntry("V1a", "common-cathode", Map.of("device", new Setting.Word("6267")));
    return new ChassisAnswer(
        new Chassis("\u00B5 \"amp\"", Conditions.USUAL, List.of(), List.of(entry)),
        List.of(
            new SupplyAnswer(
                "A", 300, 290, 310, 5e-3, 330, OptionalDouble.of(0.02), OptionalDouble.of(0.5)),
            new SupplyAnswer(
                "B", 250, 240, 260, 1e-3, 330, OptionalDouble.empty(), OptionalDouble.empty())),
        List.of(full(), bare()),
        List.of(new ChassisAnswer.Failure("V3", "no operating point")),
        List.of(
            new Discharge(
                "supply A",
                "supply.A.reservoir",
                22e-6,
                330,
                1.2,
                Double.POSITIVE_INFINITY,
                60,
                Double.POSITIVE_INFINITY,
                "nothing")),
        330,
        List.of(),
        List.of(FINDING));
  }
}
