package perveance.engine.circuit;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import perveance.engine.base.PhysicalConstants;
import perveance.engine.circuit.Element.Inductor;
import perveance.engine.circuit.Element.Junction;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.Valve;
import perveance.engine.device.ElectrodeCurrents;

/**
 * Noise about a dc point, by the adjoint network: one transposed solution at each frequency gives
 * the effect of every source of noise on the output (R. Rohrer, L. Nagel, R. Meyer and L. Weber,
 * IEEE J. Solid-State Circuits 6, 204, 1971).
 *
 * <p>Counted are: thermal noise 4 k T R of resistors and windings; of each valve {@link ValveNoise}
 * with flicker, as a voltage in series with its grid, and the shot noise 2 e I of its grid current;
 * shot noise of junctions. Not counted: excess noise of composition resistors, avalanche noise of
 * zeners, rectifier valves, hum.
 */
public final class Noise {
  /** Even number of Simpson intervals in a decade; halves would change the sum below 1e-6. */
  private static final int PER_DECADE = 32;

  private final DcSolution point;
  private final SmallSignal signals;

  /**
   * Noise about a dc point.
   *
   * @param point dc point
   */
  public Noise(DcSolution point) {
    this.point = point;
    this.signals = new SmallSignal(point);
  }

  /**
   * Noise between two nodes.
   *
   * @param source element index of the source to which noise is referred
   * @param plus node number
   * @param minus node number, 0 for chassis
   * @param band band and assumptions
   * @return total and shares
   */
  public NoiseAnswer between(int source, int plus, int minus, NoiseBand band) {
    double decades = Math.log10(band.highest() / band.lowest());
    int intervals = 2 * Math.max(2, (int) Math.ceil(decades * PER_DECADE / 2));
    double width = Math.log(band.highest() / band.lowest()) / intervals;
    double[] square = new double[point.circuit().elements().size()];
    for (int i = 0; i <= intervals; i++) {
      double frequency = band.lowest() * Math.exp(i * width);
      double simpson = i == 0 || i == intervals ? 1 : i % 2 == 1 ? 4 : 2;
      add(square, simpson * width / 3 * frequency, plus, minus, frequency, band);
    }
    double gain = Math.abs(signals.midbandGain(source, plus, minus));
    return answer(square, gain);
  }

  private NoiseAnswer answer(double[] square, double gain) {
    double total = 0;
    for (double s : square) {
      total += s;
    }
    List<NoiseAnswer.Share> shares = new ArrayList<>();
    for (int i = 0; i < square.length; i++) {
      if (square[i] > 0) {
        String name = point.circuit().elements().get(i).name();
        shares.add(new NoiseAnswer.Share(name, Math.sqrt(square[i]), square[i] / total));
      }
    }
    shares.sort(Comparator.comparingDouble(NoiseAnswer.Share::output).reversed());
    return new NoiseAnswer(Math.sqrt(total), gain, shares);
  }

  private void add(
      double[] square, double weight, int plus, int minus, double frequency, NoiseBand band) {
    FrameSolver effects = signals.effects(plus, minus, frequency);
    double thermal = 4 * PhysicalConstants.BOLTZMANN * band.temperature();
    double flicker = band.flickerCorner() / frequency;
    List<Element> elements = point.circuit().elements();
    for (int i = 0; i < square.length; i++) {
      Element element = elements.get(i);
      double density = 0;
      if (element instanceof Resistor e) {
        density = thermal / e.resistance() * squareOf(effects, e.a(), e.b());
      } else if (element instanceof Inductor e) {
        density = thermal * e.resistance() * squareAt(effects, signals.place(i));
      } else if (element instanceof Transformer e) {
        for (int w = 0; w < e.windings().size(); w++) {
          double resistance = e.windings().get(w).resistance();
          density += thermal * resistance * squareAt(effects, signals.place(i) + w);
        }
      } else if (element instanceof Junction e) {
        density = shot(point.current(e.name())) * squareOf(effects, e.anode(), e.cathode());
      } else if (element instanceof Valve e) {
        density = valve(e, effects, flicker);
      }
      square[i] += weight * density;
    }
  }

  private double valve(Valve valve, FrameSolver effects, double flicker) {
    ValvePoint at = point.valve(valve.name());
    int[] nodes = {valve.anode(), valve.grid(), valve.screen()};
    double re = 0;
    double im = 0;
    for (int e = 0; e < nodes.length; e++) {
      double slope = at.slope(e, ElectrodeCurrents.GRID);
      re += slope * (effects.re(nodes[e]) - effects.re(valve.cathode()));
      im += slope * (effects.im(nodes[e]) - effects.im(valve.cathode()));
    }
    double grid = shot(at.current(ElectrodeCurrents.GRID));
    return ValveNoise.density(at, flicker) * (re * re + im * im)
        + grid * squareOf(effects, valve.grid(), valve.cathode());
  }

  private static double shot(double current) {
    return 2 * PhysicalConstants.ELEMENTARY_CHARGE * Math.abs(current);
  }

  private static double squareOf(FrameSolver effects, int a, int b) {
    double re = effects.re(a) - effects.re(b);
    double im = effects.im(a) - effects.im(b);
    return re * re + im * im;
  }

  private static double squareAt(FrameSolver effects, int place) {
    double re = effects.re(place);
    double im = effects.im(place);
    return re * re + im * im;
  }
}
