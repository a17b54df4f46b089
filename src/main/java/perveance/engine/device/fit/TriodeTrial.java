package perveance.engine.device.fit;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.base.PhysicalConstants;
import perveance.engine.device.Evidence;
import perveance.engine.device.SpreadTriodeLaw;
import perveance.engine.device.SpreadTriodeParameters;
import perveance.engine.numeric.FitOutcome;
import perveance.engine.numeric.FitParameter;
import perveance.engine.numeric.LeastSquares;
import perveance.engine.numeric.ParameterDomain;

/** One fit of a triode from one start. */
final class TriodeTrial {
  /**
   * Spread of an indirectly heated cathode's potential, sqrt 3 times its standard deviation: 2 k T
   * / e at 1000 K, the order of initial velocities and of patches on an oxide cathode. The static
   * evidence of the types with most of it allows 0.15 V to 0.35 V.
   */
  static final double CATHODE_SPREAD = 0.3;

  /** Common temperature of an oxide cathode [K]. */
  static final double CATHODE_TEMPERATURE = 1000;

  /** Grid perveance over cathode perveance, the middle of three measured 12AX7 (DAFx-11). */
  static final double GRID_SHARE = 0.35;

  /** Part of the cut-off voltage by which contact potentials differ besides. */
  private static final double CONTACT_SHARE = 0.04;

  /**
   * Penetration factor behind loose places of the grid over the mean: about the least with which
   * both cut-off points of the 12AT7, the one type that asks for such places, come within a tenth.
   */
  static final double REMOTE_PENETRATION = 2.2;

  /** Largest share of the cathode that such places are taken to have [1]. */
  private static final double LARGEST_REMOTE_SHARE = 0.05;

  private static final double REMOTE_START = 0.001;
  private static final double REMOTE_DEVIATION = 0.01;
  private static final int REMOTE = 4;

  private static final List<String> FITTED =
      List.of("perveance", "contact_potential", "penetration", "spread", "remote_share");

  private final List<Evidence> used;
  private final List<Observation> observations;
  private final FitConditions conditions;
  private final GridClass gridClass;
  private final boolean remote;
  private final FitOutcome outcome;

  TriodeTrial(
      List<Evidence> used,
      List<Observation> observations,
      FitConditions conditions,
      GridClass gridClass,
      double mu,
      double spread,
      boolean remote) {
    this.used = used;
    this.observations = observations;
    this.conditions = conditions;
    this.gridClass = gridClass;
    this.remote = remote;
    int count = observations.size();
    double[] observed = new double[count + (remote ? 3 : 2)];
    double[] deviation = new double[observed.length];
    for (int i = 0; i < count; i++) {
      observed[i] = observations.get(i).target();
      deviation[i] = observations.get(i).deviation();
    }
    observed[count] = gridClass.spread();
    deviation[count] = gridClass.spreadDeviation();
    observed[count + 1] = gridClass.contactPotential();
    deviation[count + 1] =
        Math.hypot(gridClass.contactDeviation(), CONTACT_SHARE * highestVoltage() / mu);
    if (remote) {
      deviation[count + 2] = REMOTE_DEVIATION;
    }
    List<FitParameter> start = start(mu, spread);
    this.outcome =
        conditions.robust()
            ? LeastSquares.fitRobustly(this::predict, start, observed, deviation)
            : LeastSquares.fit(this::predict, start, observed, deviation);
  }

  private double highestVoltage() {
    return used.stream().mapToDouble(Evidence::anodeVoltage).max().orElse(0);
  }

  /** The perveance that gives the highest current at the assumed mu and spread. */
  private List<FitParameter> start(double mu, double spread) {
    double contact = gridClass == GridClass.FILAMENT ? 2 : gridClass.contactPotential();
    double penetration = 1.03 / mu;
    double perveance = 1e-3;
    double highest = 0;
    for (Evidence entry : used) {
      double current = entry.anodeCurrent().orElse(0);
      if (current > highest && !entry.kind().equals("cut-off")) {
        highest = current;
        LawReadings unit = new LawReadings(law(new double[] {1, contact, penetration, spread}));
        double perUnit = unit.predict(entry, Figure.CURRENT);
        perveance = perUnit > 0 ? current / perUnit : perveance;
      }
    }
    List<FitParameter> start = new ArrayList<>();
    if (remote) {
      start.add(
          new FitParameter(
              "remote share", REMOTE_START, new ParameterDomain.Between(0, LARGEST_REMOTE_SHARE)));
    }
    start.addAll(
        0,
        List.of(
            new FitParameter("perveance", perveance, new ParameterDomain.Positive()),
            new FitParameter("contact potential", contact, new ParameterDomain.Free(0.1)),
            new FitParameter("penetration", penetration, new ParameterDomain.Positive()),
            new FitParameter("spread", spread, new ParameterDomain.Between(0, 1))));
    return start;
  }

  private SpreadTriodeLaw law(double[] p) {
    double cathodeSpread =
        CATHODE_SPREAD + conditions.filament().map(Filament::cathodeSpread).orElse(0.0);
    return new SpreadTriodeLaw(
        new SpreadTriodeParameters(
            p[0],
            p[1],
            p[2],
            p[3],
            cathodeSpread,
            p.length > REMOTE ? p[REMOTE] : 0,
            p.length > REMOTE ? REMOTE_PENETRATION : 1,
            gridClass.turnBack(),
            GRID_SHARE * p[0],
            conditions.gridOnset().orElse(gridClass.gridOnset()),
            PhysicalConstants.thermalVoltage(CATHODE_TEMPERATURE)));
  }

  private void predict(double[] parameters, double[] predicted) {
    LawReadings readings = new LawReadings(law(parameters));
    int count = observations.size();
    for (int i = 0; i < count; i++) {
      predicted[i] = observations.get(i).predicted(readings);
    }
    predicted[count] = parameters[3];
    predicted[count + 1] = parameters[1];
    if (remote) {
      predicted[count + 2] = parameters[REMOTE];
    }
  }

  FitOutcome outcome() {
    return outcome;
  }

  double rms() {
    return fitted().rms();
  }

  private FitOutcome.Fitted fitted() {
    if (outcome instanceof FitOutcome.Fitted fitted) {
      return fitted;
    }
    throw new IllegalStateException("not fitted");
  }

  LawFit result() {
    FitOutcome.Fitted fitted = fitted();
    List<String> keys = remote ? FITTED : FITTED.subList(0, REMOTE);
    return FitReport.of(
        law(fitted.parameters()), used, observations, fitted, keys, assumptions(fitted));
  }

  private List<String> assumptions(FitOutcome.Fitted fitted) {
    List<String> assumptions = new ArrayList<>();
    double left = fitted.standardDeviation(3) / gridClass.spreadDeviation();
    if (left > 0.7) {
      assumptions.add(
          FitReport.text(
              "the evidence does not fix the spread; the usual value of its class (%s) was taken,"
                  + " %.2f +- %.2f",
              gridClass.words(), gridClass.spread(), gridClass.spreadDeviation()));
    }
    assumptions.add(cathodeSpread());
    if (conditions.gridOnset().isEmpty()) {
      assumptions.add(
          FitReport.text(
              "onset of grid current at %.1f V: value of its class, not published",
              gridClass.gridOnset()));
    }
    if (remote) {
      assumptions.add(
          FitReport.text(
              "behind loose places of the grid the penetration factor is %.1f times the mean",
              REMOTE_PENETRATION));
    }
    assumptions.add("grid perveance 0.35 of the cathode's, cathode at 1000 K: common values");
    return assumptions;
  }

  private String cathodeSpread() {
    return conditions
        .filament()
        .map(
            filament ->
                FitReport.text(
                    "voltages refer to the filament's middle (%s); cathode spread half of"
                        + " %.1f V and %.1f V",
                    filament.heating() == Heating.ALTERNATING
                        ? "heated with alternating current"
                        : "evidence taken to the negative end of a filament heated with"
                            + " direct current",
                    filament.voltage(),
                    CATHODE_SPREAD))
        .orElse(FitReport.text("cathode spread %.1f V: common to oxide cathodes", CATHODE_SPREAD));
  }
}
