package perveance.accuracy;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.device.DeviceLaw;

/** Published triode stages, which no law was fitted to. */
final class TriodeStageAccuracy implements AccuracySource {
  private static final String PHILIPS = "Philips/Mullard valve data handbook (memory)";
  private static final String RCA = "RCA Receiving Tube Manual (memory)";
  private static final String[] SUPPLIES = {"90 V", "180 V", "300 V"};

  @Override
  public List<AccuracyLine> lines() {
    List<AccuracyLine> lines = new ArrayList<>();
    StageErrors ecc83 = StageErrors.ecc83(Library.device("12AX7").law());
    lines.add(predicted("12AX7", "resistance-coupled current", ecc83.current(), PHILIPS));
    lines.add(predicted("12AX7", "resistance-coupled gain", ecc83.gain(), PHILIPS));
    lines.add(
        AccuracyLine.points(
            "12AX7", "resistance-coupled distortion", false, ecc83.distortion(), PHILIPS));
    List<List<Double>> gain = StageErrors.gain6sl7gt(Library.device("6SL7GT").law());
    for (int i = 0; i < SUPPLIES.length; i++) {
      lines.add(predicted("6SL7GT", "resistance-coupled gain, " + SUPPLIES[i], gain.get(i), RCA));
    }
    List<Double> ay7 = new ArrayList<>();
    for (ReferenceTable.Row row : ReferenceTable.read("12ay7-resistance-coupled.tsv")) {
      DeviceLaw law = Library.device("12AY7").law();
      ay7.add(StageErrors.stage(law, row).gain() / row.number("gain") - 1);
    }
    lines.add(predicted("12AY7", "resistance-coupled gain", ay7, RCA));
    for (String type : new String[] {"2A3", "45", "300B"}) {
      SingleEndedTriodesTest.Errors errors = SingleEndedTriodesTest.errors(type);
      String source = type.equals("300B") ? "Western Electric 300B sheet of 1950 (memory)" : RCA;
      lines.add(predicted(type, "class A power", errors.power(), source));
      lines.add(
          AccuracyLine.points(type, "class A second harmonic", false, errors.second(), source));
      if (!errors.third().isEmpty()) {
        lines.add(
            AccuracyLine.points(type, "class A third harmonic", false, errors.third(), source));
      }
    }
    return lines;
  }

  private static AccuracyLine predicted(
      String type, String kind, List<Double> errors, String source) {
    return AccuracyLine.relative(type, kind, false, errors, source);
  }
}
