package perveance.engine.analysis;

import perveance.engine.circuit.Complex;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.circuit.SmallSignal;
import perveance.engine.circuit.ValvePoint;

/**
 * Capacitance that the stage shows at its input: the current into the stage's own parts at the
 * input node for one volt on it, so that whatever gain stands behind a capacitance multiplies it
 * (J. M. Miller, Bur. Stand. Sci. Pap. 351, 1919).
 */
final class InputAdmittance {
  /** Low enough for a stopper to be none; coupling capacitors are shorts whatever it is. */
  private static final double FREQUENCY = 2e3;

  private InputAdmittance() {}

  /** Input capacitance [F]. */
  static double capacitance(StageModel model) {
    if (model.signal().refusal().isPresent()) {
      return 0;
    }
    double susceptance =
        model.stage().input().isPresent() ? behindSource(model) : intoOwnParts(model);
    return susceptance / (2 * Math.PI * FREQUENCY);
  }

  private static double behindSource(StageModel model) {
    SmallSignal signal = model.signal();
    Complex current = signal.strayInputAdmittance(model.source(), FREQUENCY);
    Complex voltage = signal.strayTransfer(model.source(), model.stage().inputNode(), 0, FREQUENCY);
    return imaginaryOfRatio(current, voltage);
  }

  private static double intoOwnParts(StageModel model) {
    int input = model.stage().inputNode();
    Complex at = transfer(model, input);
    double sum = 0;
    for (Element element : model.circuit().elements()) {
      if (model.owns(element) && element instanceof Capacitor c && c.a() != c.b()) {
        sum += 2 * Math.PI * FREQUENCY * c.capacitance() * real(model, at, input, c.a(), c.b());
      } else if (model.owns(element) && element instanceof Resistor r) {
        sum += imaginary(model, at, input, r.a(), r.b()) / r.resistance();
      } else if (model.owns(element) && element instanceof Valve v) {
        sum += intoValve(model, at, v);
      }
    }
    return sum;
  }

  /**
   * Imaginary part of the current that one volt at the input sends into a valve's electrodes there,
   * as into the cathode of a grounded grid whose anode turns the phase.
   */
  private static double intoValve(StageModel model, Complex at, Valve valve) {
    int input = model.stage().inputNode();
    int[] node = {valve.anode(), valve.grid(), valve.screen()};
    ValvePoint point = model.dc().valve(valve.name());
    double cathode = imaginaryOfRatio(transfer(model, valve.cathode()), at);
    double sum = 0;
    for (int by = 0; by < node.length; by++) {
      double swing = imaginaryOfRatio(transfer(model, node[by]), at) - cathode;
      for (int e = 0; e < node.length; e++) {
        double current = point.slope(e, by) * swing;
        sum += (node[e] == input ? current : 0) - (valve.cathode() == input ? current : 0);
      }
    }
    return sum;
  }

  private static Complex transfer(StageModel model, int node) {
    return model.signal().strayTransfer(model.source(), node, 0, FREQUENCY);
  }

  /** Real part of (v(input) - v(other)) / v(input), zero for an element elsewhere. */
  private static double real(StageModel model, Complex at, int input, int a, int b) {
    if (a != input && b != input) {
      return 0;
    }
    Complex other = other(model, input, a, b);
    return 1 - realOfRatio(other, at);
  }

  private static double imaginary(StageModel model, Complex at, int input, int a, int b) {
    return a != input && b != input ? 0 : -imaginaryOfRatio(other(model, input, a, b), at);
  }

  private static Complex other(StageModel model, int input, int a, int b) {
    return transfer(model, a == input ? b : a);
  }

  private static double realOfRatio(Complex up, Complex down) {
    double square = down.re() * down.re() + down.im() * down.im();
    return (up.re() * down.re() + up.im() * down.im()) / square;
  }

  private static double imaginaryOfRatio(Complex up, Complex down) {
    double square = down.re() * down.re() + down.im() * down.im();
    return (up.im() * down.re() - up.re() * down.im()) / square;
  }
}
