package perveance.engine.device.fit;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.ElectrodeCurrents;
import perveance.engine.device.Evidence;
import perveance.engine.device.LawKind;
import perveance.engine.numeric.RootOutcome;
import perveance.engine.numeric.Roots;

/** Reads off a law what a piece of evidence states. */
public final class LawReadings {
  private static final int ANODE = ElectrodeCurrents.ANODE;
  private static final int GRID = ElectrodeCurrents.GRID;
  private static final int SCREEN = ElectrodeCurrents.SCREEN;

  /** Chart readings are told against at least this share of the chart's highest current. */
  private static final double CHART_SHARE = 0.1;

  private static final double ROOT_TOLERANCE = 1e-10;
  private static final double FARTHEST_GRID = 1e4;

  private final DeviceLaw law;
  private final ElectrodeCurrents out = new ElectrodeCurrents();

  /**
   * Reads this law.
   *
   * @param law the law
   */
  public LawReadings(DeviceLaw law) {
    this.law = law;
  }

  /**
   * Compares every figure of the evidence with the law.
   *
   * @param evidence any evidence; entries without a grid voltage are left out for laws with a grid
   * @return residuals in the order of the evidence
   */
  public List<Residual> compare(List<Evidence> evidence) {
    double highest = highestCurve(evidence);
    List<Residual> residuals = new ArrayList<>();
    for (Evidence entry : evidence) {
      if (law.kind() != LawKind.DIODE && entry.gridVoltage().isEmpty()) {
        continue;
      }
      for (Figure figure : Figure.values()) {
        OptionalDouble published = published(entry, figure);
        if (published.isPresent()) {
          double value = published.getAsDouble();
          double scale = Math.abs(value);
          if (entry.kind().equals("curve")) {
            scale = Math.max(scale, CHART_SHARE * highest);
          }
          if (scale > 0) {
            residuals.add(new Residual(entry, figure, value, predict(entry, figure), scale));
          }
        }
      }
    }
    return residuals;
  }

  /**
   * The highest chart reading.
   *
   * @param evidence any evidence
   * @return highest current of a curve, 0 without curves [A]
   */
  static double highestCurve(List<Evidence> evidence) {
    double highest = 0;
    for (Evidence entry : evidence) {
      if (entry.kind().equals("curve")) {
        highest = Math.max(highest, entry.anodeCurrent().orElse(0));
      }
    }
    return highest;
  }

  /**
   * What the evidence states.
   *
   * @param entry evidence
   * @param figure which figure
   * @return the stated value [SI unit of the figure]; empty when it states none
   */
  static OptionalDouble published(Evidence entry, Figure figure) {
    boolean cutOff = entry.kind().equals("cut-off");
    return switch (figure) {
      case CURRENT -> cutOff ? OptionalDouble.empty() : entry.anodeCurrent();
      case SCREEN_CURRENT -> entry.screenCurrent();
      case AMPLIFICATION -> entry.amplificationFactor();
      case ANODE_RESISTANCE -> entry.anodeResistance();
      case MUTUAL_CONDUCTANCE -> entry.mutualConductance();
      case CUT_OFF ->
          cutOff && entry.anodeCurrent().isPresent() ? entry.gridVoltage() : OptionalDouble.empty();
    };
  }

  /**
   * What the law says.
   *
   * @param entry evidence that states the figure
   * @param figure which figure
   * @return the law's value; ra and mu without conduction are infinite [SI unit of the figure]
   */
  public double predict(Evidence entry, Figure figure) {
    if (figure == Figure.CUT_OFF) {
      return gridAt(entry, entry.anodeCurrent().orElse(0));
    }
    evaluate(entry, entry.gridVoltage().orElse(0));
    return switch (figure) {
      case CURRENT -> current(entry);
      case SCREEN_CURRENT -> out.current(SCREEN);
      case AMPLIFICATION -> amplification(entry);
      case ANODE_RESISTANCE -> 1 / anodeConductance(entry);
      case MUTUAL_CONDUCTANCE -> mutualConductance(entry);
      case CUT_OFF -> throw new IllegalStateException("handled above");
    };
  }

  private void evaluate(Evidence entry, double grid) {
    double screen = tied(entry) ? entry.anodeVoltage() : entry.screenVoltage().orElse(0);
    law.evaluate(entry.anodeVoltage(), grid, screen, out);
  }

  private boolean tied(Evidence entry) {
    return law.kind() == LawKind.PENTODE && entry.connection().equals("triode");
  }

  private double current(Evidence entry) {
    return tied(entry) ? out.current(ANODE) + out.current(SCREEN) : out.current(ANODE);
  }

  private double mutualConductance(Evidence entry) {
    return tied(entry) ? out.slope(ANODE, GRID) + out.slope(SCREEN, GRID) : out.slope(ANODE, GRID);
  }

  private double anodeConductance(Evidence entry) {
    if (!tied(entry)) {
      return out.slope(ANODE, ANODE);
    }
    return out.slope(ANODE, ANODE)
        + out.slope(ANODE, SCREEN)
        + out.slope(SCREEN, ANODE)
        + out.slope(SCREEN, SCREEN);
  }

  private double amplification(Evidence entry) {
    if (law.kind() == LawKind.PENTODE && !tied(entry)) {
      double byGrid = out.slope(ANODE, GRID) + out.slope(SCREEN, GRID);
      return byGrid / (out.slope(ANODE, SCREEN) + out.slope(SCREEN, SCREEN));
    }
    return mutualConductance(entry) / anodeConductance(entry);
  }

  /** The grid voltage at which a current flows; the farthest voltage when it flows nowhere. */
  private double gridAt(Evidence entry, double current) {
    double low = -1;
    while (low > -FARTHEST_GRID && currentAt(entry, low) > current) {
      low *= 2;
    }
    double high = 1;
    while (high < FARTHEST_GRID && currentAt(entry, high) < current) {
      high *= 2;
    }
    RootOutcome outcome =
        Roots.bracketed(grid -> currentAt(entry, grid) - current, low, high, ROOT_TOLERANCE);
    return outcome instanceof RootOutcome.Found found ? found.x() : low;
  }

  private double currentAt(Evidence entry, double grid) {
    evaluate(entry, grid);
    return current(entry);
  }
}
