package perveance.engine.device.fit;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import perveance.engine.base.PhysicalConstants;
import perveance.engine.device.Evidence;
import perveance.engine.device.SpreadPentodeLaw;
import perveance.engine.device.SpreadPentodeParameters;
import perveance.engine.numeric.FitOutcome;
import perveance.engine.numeric.FitParameter;
import perveance.engine.numeric.LeastSquares;
import perveance.engine.numeric.ParameterDomain;

/** One fit of a pentode or beam tetrode from one start. */
final class PentodeTrial {
  private static final int CONTACT = 1;
  private static final int SPREAD = 3;
  private static final int INFLUENCE = 4;
  private static final int FALL = 6;
  private static final int EXTRA = 7;

  private static final double CONTACT_POTENTIAL = 0.6;
  private static final double CONTACT_DEVIATION = 0.3;

  /** Relative deviation of the anode's influence between types of a class, as a logarithm. */
  private static final double INFLUENCE_DEVIATION = 1;

  /** Relative deviation of the fall of the screen's share, as a logarithm. */
  private static final double FALL_DEVIATION = 0.4;

  /** Relative deviation of the width of the beams, as a logarithm. */
  private static final double WIDTH_DEVIATION = 0.1;

  /**
   * Penetration factor of the wide turns of a remote cut-off grid over the mean: the value at which
   * the rest of the 6SK7's grid comes out as that of other small pentodes (contact potential 0.6 V,
   * spread 0.5) and each of its two tabulated points best predicts the other's slopes. At 3 its
   * mutual conductance at -35 V was 40 % low.
   */
  private static final double REMOTE_PENETRATION = 4;

  private static final double REMOTE_SHARE = 0.05;

  /** Relative deviation of the part with wide turns, as a logarithm. */
  private static final double REMOTE_DEVIATION = 1.5;

  private static final double GRID_ONSET = -0.6;

  private final List<Evidence> used;
  private final List<Observation> observations;
  private final FitConditions conditions;
  private final PentodeClass pentodeClass;
  private final boolean beam;
  private final boolean remote;
  private final FitOutcome outcome;

  PentodeTrial(
      List<Evidence> used,
      List<Observation> observations,
      FitConditions conditions,
      PentodeClass pentodeClass,
      double mu) {
    this.used = used;
    this.observations = observations;
    this.conditions = conditions;
    this.pentodeClass = pentodeClass;
    this.beam = pentodeClass == PentodeClass.BEAM;
    this.remote = pentodeClass == PentodeClass.REMOTE;
    int count = observations.size();
    double[] usual = usual();
    double[] observed = new double[count + usual.length];
    double[] deviation = new double[count + usual.length];
    for (int i = 0; i < count; i++) {
      observed[i] = observations.get(i).target();
      deviation[i] = observations.get(i).deviation();
    }
    System.arraycopy(usual, 0, observed, count, usual.length);
    System.arraycopy(usualDeviations(), 0, deviation, count, usual.length);
    List<FitParameter> start = start(mu);
    this.outcome =
        conditions.robust()
            ? LeastSquares.fitRobustly(this::predict, start, observed, deviation)
            : LeastSquares.fit(this::predict, start, observed, deviation);
  }

  /** The usual values of the class, which take part as observations. */
  private double[] usual() {
    double fall = beam ? pentodeClass.shareOffset() : pentodeClass.shareFall();
    double[] usual = {
      CONTACT_POTENTIAL,
      pentodeClass.spread(),
      Math.log(pentodeClass.anodeInfluence()),
      Math.log(fall),
      Math.log(beam ? pentodeClass.beamWidth() : REMOTE_SHARE)
    };
    return Arrays.copyOf(usual, usual.length - (hasExtra() ? 0 : 1));
  }

  private double[] usualDeviations() {
    double[] deviations = {
      CONTACT_DEVIATION,
      pentodeClass.spreadDeviation(),
      INFLUENCE_DEVIATION,
      FALL_DEVIATION,
      beam ? WIDTH_DEVIATION : REMOTE_DEVIATION
    };
    return Arrays.copyOf(deviations, deviations.length - (hasExtra() ? 0 : 1));
  }

  private boolean hasExtra() {
    return beam || remote;
  }

  /** The perveance that gives the highest tabulated current at the assumed mu. */
  private List<FitParameter> start(double mu) {
    double fall = beam ? pentodeClass.shareOffset() : pentodeClass.shareFall();
    double[] values = {
      1,
      CONTACT_POTENTIAL,
      1 / mu,
      pentodeClass.spread(),
      pentodeClass.anodeInfluence(),
      0.12,
      fall,
      beam ? pentodeClass.beamWidth() : REMOTE_SHARE
    };
    LawReadings unit = new LawReadings(law(values));
    double highest = 0;
    double perveance = 1e-3;
    for (Evidence entry : used) {
      double current = entry.anodeCurrent().orElse(0);
      double perUnit = unit.predict(entry, Figure.CURRENT);
      if (current > highest && perUnit > 0) {
        highest = current;
        perveance = current / perUnit;
      }
    }
    List<FitParameter> start = new ArrayList<>();
    start.add(FitParameter.positive("perveance", perveance));
    start.add(
        new FitParameter("contact potential", CONTACT_POTENTIAL, new ParameterDomain.Free(0.1)));
    start.add(FitParameter.positive("penetration", 1 / mu));
    start.add(FitParameter.between("spread", pentodeClass.spread(), 0, 1));
    start.add(FitParameter.between("anode influence", pentodeClass.anodeInfluence(), 0, 1));
    start.add(FitParameter.between("screen share", 0.12, 0, 2));
    start.add(FitParameter.between(beam ? "share offset" : "share fall", fall, 0, beam ? 10 : 1));
    if (beam) {
      start.add(FitParameter.positive("beam width", pentodeClass.beamWidth()));
    } else if (remote) {
      start.add(FitParameter.between("remote share", REMOTE_SHARE, 0, 1));
    }
    return start;
  }

  private SpreadPentodeLaw law(double[] p) {
    return new SpreadPentodeLaw(
        new SpreadPentodeParameters(
            p[0],
            p[CONTACT],
            p[2],
            p[SPREAD],
            TriodeTrial.CATHODE_SPREAD,
            remote ? p[EXTRA] : 0,
            remote ? REMOTE_PENETRATION : 1,
            p[INFLUENCE],
            p[5],
            beam ? pentodeClass.shareFall() : p[FALL],
            beam ? p[FALL] : pentodeClass.shareOffset(),
            beam ? p[EXTRA] : 0,
            pentodeClass.knee(),
            pentodeClass.kneeSharpness(),
            TriodeTrial.GRID_SHARE * p[0],
            conditions.gridOnset().orElse(GRID_ONSET),
            PhysicalConstants.thermalVoltage(TriodeTrial.CATHODE_TEMPERATURE)));
  }

  private void predict(double[] p, double[] predicted) {
    LawReadings readings = new LawReadings(law(p));
    int count = observations.size();
    for (int i = 0; i < count; i++) {
      predicted[i] = observations.get(i).predicted(readings);
    }
    predicted[count] = p[CONTACT];
    predicted[count + 1] = p[SPREAD];
    predicted[count + 2] = Math.log(p[INFLUENCE]);
    predicted[count + 3] = Math.log(p[FALL]);
    if (hasExtra()) {
      predicted[count + 4] = Math.log(p[EXTRA]);
    }
  }

  FitOutcome outcome() {
    return outcome;
  }

  FitOutcome.Fitted fitted() {
    if (outcome instanceof FitOutcome.Fitted fitted) {
      return fitted;
    }
    throw new IllegalStateException("not fitted");
  }

  LawFit result() {
    FitOutcome.Fitted fitted = fitted();
    return FitReport.of(
        law(fitted.parameters()), used, observations, fitted, fittedKeys(), assumptions(fitted));
  }

  private List<String> fittedKeys() {
    List<String> keys =
        new ArrayList<>(
            List.of(
                "perveance",
                "contact_potential",
                "penetration",
                "spread",
                "anode_influence",
                "screen_share",
                beam ? "share_offset" : "share_fall"));
    if (hasExtra()) {
      keys.add(beam ? "beam_width" : "remote_share");
    }
    return keys;
  }

  private List<String> assumptions(FitOutcome.Fitted fitted) {
    List<String> assumptions = new ArrayList<>();
    if (fitted.standardDeviation(SPREAD) > 0.7 * pentodeClass.spreadDeviation()) {
      assumptions.add(
          FitReport.text(
              "the evidence does not fix the spread; the usual value of %s was taken, %.2f +- %.2f",
              pentodeClass.words(), pentodeClass.spread(), pentodeClass.spreadDeviation()));
    }
    if (fitted.standardDeviation(CONTACT) > 0.7 * CONTACT_DEVIATION) {
      assumptions.add(
          FitReport.text(
              "the evidence does not fix the contact potential; usual value %.1f V +- %.1f V",
              CONTACT_POTENTIAL, CONTACT_DEVIATION));
    }
    if (remote) {
      assumptions.add(
          FitReport.text(
              "wide turns have %.0f times the mean penetration factor: usual value",
              REMOTE_PENETRATION));
    }
    assumptions.add("knee: value of " + pentodeClass.words());
    assumptions.add(
        FitReport.text(
            "cathode spread %.1f V: common to oxide cathodes", TriodeTrial.CATHODE_SPREAD));
    if (conditions.gridOnset().isEmpty()) {
      assumptions.add(
          FitReport.text(
              "onset of grid current at %.1f V: usual value, not published", GRID_ONSET));
    }
    assumptions.add("grid perveance 0.35 of the cathode's, cathode at 1000 K: common values");
    return assumptions;
  }
}
