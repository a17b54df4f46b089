package perveance.app.wording;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.Discharge;
import perveance.engine.analysis.SupplyAnswer;
import perveance.engine.base.Unit;

/**
 * The cautions of one chassis, computed for it: stands above every figure that leads a hand to it.
 *
 * @param signal signal word: DANGER or NOTE
 * @param headline highest voltage
 * @param consequence what it can do
 * @param steps one act per line, in order
 * @param footer who decides
 */
public record SafetyBox(
    String signal, String headline, String consequence, List<String> steps, String footer) {
  /** Copies the list. */
  public SafetyBox {
    steps = List.copyOf(steps);
  }

  /**
   * The box for a chassis.
   *
   * @param answer the chassis' answer
   * @return cautions with this chassis' volts, joules and seconds
   */
  public static SafetyBox of(ChassisAnswer answer) {
    double threshold = answer.chassis().conditions().threshold();
    boolean lethal = answer.highestVoltage() > threshold;
    List<String> steps = new ArrayList<>();
    steps.add("Mains lead out of the wall and in sight.");
    steps.addAll(waits(answer));
    steps.add("Drain through a resistor, then measure every reservoir: " + blanks(answer) + ".");
    steps.add(
        "Take the drain clip off before power. One hand, a second person near, load connected.");
    steps.add(
        "Stop at glow on an anode, smoke, or any reading past its stop limit. "
            + "Stopping is a normal outcome.");
    return new SafetyBox(
        lethal ? "DANGER" : "NOTE",
        Figures.reading(answer.highestVoltage(), Unit.VOLT),
        lethal ? "can kill, also after switch-off" : "highest voltage in this chassis",
        steps,
        "Local electrical codes and competent or licensed persons decide whether and how this is"
            + " done. Threshold "
            + Figures.part(threshold, Unit.VOLT)
            + " dc: check your local rule.");
  }

  private static List<String> waits(ChassisAnswer answer) {
    List<String> lines = new ArrayList<>();
    for (Discharge d : answer.discharges()) {
      lines.add(wait(d));
      if (lines.size() == 3) {
        break;
      }
    }
    if (lines.isEmpty()) {
      lines.add(
          "No reservoir is stated in this file: how long the supply stays charged is not known."
              + " Treat it as charged until measured.");
    }
    return lines;
  }

  private static String wait(Discharge d) {
    String what =
        d.where()
            + ": "
            + Figures.part(d.capacitance(), Unit.FARAD)
            + " at "
            + Figures.reading(d.voltage(), Unit.VOLT)
            + " holds "
            + Figures.reading(d.energy(), Unit.JOULE, 2);
    if (Double.isInfinite(d.seconds())) {
      return "Wait does not help at " + what + ", and nothing in this file drains it.";
    }
    return "Wait: "
        + what
        + ", takes "
        + Figures.duration(d.seconds())
        + " through "
        + d.drainedBy()
        + " to fall below "
        + Figures.part(d.threshold(), Unit.VOLT)
        + "; with that path broken it never gets there.";
  }

  private static String blanks(ChassisAnswer answer) {
    List<String> names = new ArrayList<>();
    for (SupplyAnswer supply : answer.supplies()) {
      names.add(supply.name() + " ______ V");
    }
    return names.isEmpty() ? "______ V" : String.join(", ", names);
  }

  /**
   * One line for a window or a terminal.
   *
   * @return headline, wait and who decides
   */
  public String oneLine() {
    return String.format(
        Locale.ROOT,
        "%s: %s %s. Unplug, wait, drain, then measure. Local electrical codes and competent or"
            + " licensed persons decide.",
        signal,
        headline,
        consequence);
  }
}
