package perveance.engine.numeric;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import org.apache.commons.math3.fitting.leastsquares.ValueAndJacobianFunction;
import org.apache.commons.math3.linear.Array2DRowRealMatrix;
import org.apache.commons.math3.linear.ArrayRealVector;
import org.apache.commons.math3.linear.RealMatrix;
import org.apache.commons.math3.linear.RealVector;
import org.apache.commons.math3.linear.SingularValueDecomposition;
import org.apache.commons.math3.util.Pair;

/**
 * A fit in the terms of the library: predicted less observed in multiples of the deviations, as a
 * function of the inner variables, with slopes by central differences.
 */
final class FitProblem implements ValueAndJacobianFunction {
  /** Step of a central difference: the cube root of the rounding balances its two errors. */
  private static final double STEP = Math.cbrt(Math.ulp(1.0));

  /** Stands for a prediction that is not finite, so that a step there is always refused. */
  private static final double FORBIDDEN = 1e100;

  /** Slopes known to about 1e-10 cannot tell smaller singular values from none. */
  private static final double UNDETERMINED = 1e-8;

  private final Prediction prediction;
  private final List<FitParameter> parameters;
  private final double[] observed;
  private double[] deviation;
  private double[] lastParameters;
  private double[] settled = {};

  FitProblem(
      Prediction prediction, List<FitParameter> parameters, double[] observed, double[] deviation) {
    requireSizes(parameters, observed, deviation);
    for (int i = 0; i < observed.length; i++) {
      if (!Double.isFinite(observed[i])) {
        throw new IllegalArgumentException("observed " + i + " is not finite: " + observed[i]);
      }
      if (!(deviation[i] > 0) || Double.isInfinite(deviation[i])) {
        throw new IllegalArgumentException(
            "deviation " + i + " is not above 0 and finite: " + deviation[i]);
      }
    }
    this.prediction = prediction;
    this.parameters = List.copyOf(parameters);
    this.observed = observed.clone();
    this.deviation = deviation.clone();
    this.lastParameters = parameters.stream().mapToDouble(FitParameter::start).toArray();
  }

  private static void requireSizes(
      List<FitParameter> parameters, double[] observed, double[] deviation) {
    if (parameters.isEmpty() || parameters.size() > observed.length) {
      throw new IllegalArgumentException(
          parameters.size() + " parameters do not go with " + observed.length + " observations");
    }
    if (deviation.length != observed.length) {
      throw new IllegalArgumentException(
          "deviation has " + deviation.length + " entries, not " + observed.length);
    }
  }

  void weighBy(double[] newDeviation) {
    deviation = newDeviation.clone();
  }

  double[] start() {
    double[] inner = new double[parameters.size()];
    for (int j = 0; j < inner.length; j++) {
      inner[j] = parameters.get(j).domain().toInner(parameters.get(j).start());
    }
    return inner;
  }

  /** The inner variables at which the last fit settled. */
  double[] settled() {
    return settled;
  }

  double[] toOuter(double[] inner) {
    double[] outer = new double[inner.length];
    for (int j = 0; j < outer.length; j++) {
      outer[j] = parameters.get(j).domain().toOuter(inner[j]);
    }
    return outer;
  }

  double[] lastParameters() {
    return lastParameters;
  }

  boolean finiteAt(double[] inner) {
    for (double value : predicted(inner)) {
      if (!Double.isFinite(value)) {
        return false;
      }
    }
    return true;
  }

  private double[] predicted(double[] inner) {
    double[] predicted = new double[observed.length];
    double[] outer = toOuter(inner);
    if (lawful(outer)) {
      prediction.predict(outer, predicted);
    } else {
      Arrays.fill(predicted, Double.NaN);
    }
    return predicted;
  }

  /** A long step may carry a logarithm so far that the parameter is infinite, or rounds to 0. */
  private boolean lawful(double[] outer) {
    for (int j = 0; j < outer.length; j++) {
      boolean positive = parameters.get(j).domain() instanceof ParameterDomain.Positive;
      if (!Double.isFinite(outer[j]) || (positive && outer[j] == 0)) {
        return false;
      }
    }
    return true;
  }

  private double[] misfit(double[] inner) {
    double[] misfit = predicted(inner);
    for (int i = 0; i < misfit.length; i++) {
      double value = (misfit[i] - observed[i]) / deviation[i];
      misfit[i] = Double.isFinite(value) ? value : FORBIDDEN;
    }
    return misfit;
  }

  @Override
  public Pair<RealVector, RealMatrix> value(RealVector point) {
    double[] inner = point.toArray();
    return new Pair<>(computeValue(inner), computeJacobian(inner));
  }

  @Override
  public RealVector computeValue(double[] inner) {
    lastParameters = toOuter(inner);
    return new ArrayRealVector(misfit(inner), false);
  }

  @Override
  public RealMatrix computeJacobian(double[] inner) {
    double[][] slopes = new double[observed.length][inner.length];
    double[] here = misfit(inner);
    for (int j = 0; j < inner.length; j++) {
      double step = STEP * Math.max(1.0, Math.abs(inner[j]));
      double[] ahead = misfit(moved(inner, j, step));
      double[] behind = misfit(moved(inner, j, -step));
      for (int i = 0; i < here.length; i++) {
        slopes[i][j] = slope(behind[i], here[i], ahead[i], step);
      }
    }
    return new Array2DRowRealMatrix(slopes, false);
  }

  /** The central slope, or the one of the side on which the prediction is finite. */
  private static double slope(double behind, double here, double ahead, double step) {
    boolean noAhead = ahead == FORBIDDEN;
    boolean noBehind = behind == FORBIDDEN;
    if (noAhead && noBehind) {
      return 0;
    }
    double from = noBehind ? here : behind;
    double to = noAhead ? here : ahead;
    return (to - from) / (noAhead || noBehind ? step : 2 * step);
  }

  private static double[] moved(double[] inner, int j, double step) {
    double[] moved = inner.clone();
    moved[j] += step;
    return moved;
  }

  FitOutcome outcome(double[] inner, int iterations, List<Integer> distrusted) {
    settled = inner;
    double[] outer = toOuter(inner);
    List<Integer> free = new ArrayList<>();
    List<String> atBound = new ArrayList<>();
    for (int j = 0; j < inner.length; j++) {
      if (parameters.get(j).domain().atBound(inner[j])) {
        atBound.add(parameters.get(j).name());
      } else {
        free.add(j);
      }
    }
    double[][] covariance = new double[inner.length][inner.length];
    List<String> undetermined = fillCovariance(inner, free, covariance);
    if (!undetermined.isEmpty()) {
      return new FitOutcome.NotFitted(
          "the observations do not determine " + String.join(" and ", undetermined), outer);
    }
    double[] residuals = predicted(inner);
    double sum = 0;
    for (int i = 0; i < residuals.length; i++) {
      residuals[i] = observed[i] - residuals[i];
      sum += Math.pow(residuals[i] / deviation[i], 2);
    }
    double rms = Math.sqrt(sum / residuals.length);
    return new FitOutcome.Fitted(
        outer, residuals, covariance, rms, iterations, distrusted, atBound);
  }

  /** Inverts the normal matrix by singular values; returns the parameters that nothing fixes. */
  private List<String> fillCovariance(double[] inner, List<Integer> free, double[][] covariance) {
    if (free.isEmpty()) {
      return List.of();
    }
    RealMatrix slopes = new Array2DRowRealMatrix(observed.length, free.size());
    double[] length = new double[free.size()];
    List<String> undetermined = fillUnitColumns(computeJacobian(inner), free, slopes, length);
    if (!undetermined.isEmpty()) {
      return undetermined;
    }
    SingularValueDecomposition decomposition = new SingularValueDecomposition(slopes);
    double[] singular = decomposition.getSingularValues();
    RealMatrix directions = decomposition.getV();
    if (singular[singular.length - 1] < UNDETERMINED * singular[0]) {
      return involved(directions.getColumn(singular.length - 1), free);
    }
    for (int a = 0; a < length.length; a++) {
      for (int b = 0; b < length.length; b++) {
        double sum = 0;
        for (int k = 0; k < singular.length; k++) {
          sum += directions.getEntry(a, k) * directions.getEntry(b, k) / Math.pow(singular[k], 2);
        }
        double outer = outerSlope(inner, free.get(a)) * outerSlope(inner, free.get(b));
        covariance[free.get(a)][free.get(b)] = sum * outer / (length[a] * length[b]);
      }
    }
    return List.of();
  }

  /** Brings the free parameters' slopes to length one; returns the parameters without effect. */
  private List<String> fillUnitColumns(
      RealMatrix all, List<Integer> free, RealMatrix slopes, double[] length) {
    List<String> withoutEffect = new ArrayList<>();
    for (int k = 0; k < length.length; k++) {
      RealVector column = all.getColumnVector(free.get(k));
      length[k] = column.getNorm();
      if (length[k] == 0) {
        withoutEffect.add(parameters.get(free.get(k)).name());
      } else {
        slopes.setColumnVector(k, column.mapDivide(length[k]));
      }
    }
    return withoutEffect;
  }

  private double outerSlope(double[] inner, int j) {
    return parameters.get(j).domain().slope(inner[j]);
  }

  private List<String> involved(double[] direction, List<Integer> free) {
    List<String> names = new ArrayList<>();
    for (int k = 0; k < direction.length; k++) {
      if (Math.abs(direction[k]) > 0.3) {
        names.add(parameters.get(free.get(k)).name());
      }
    }
    return names;
  }
}
