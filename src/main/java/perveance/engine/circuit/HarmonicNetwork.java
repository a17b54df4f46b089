package perveance.engine.circuit;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.VoltageSource;

/**
 * The linear part of a circuit at all harmonics of a frequency, as its valves and junctions see it:
 * what a current into each of their nodes, the drive and the dc sources do everywhere. A small
 * conductance at each device node keeps nodes that only devices join determined; who uses the
 * responses takes its current back.
 */
final class HarmonicNetwork {
  /** Conductance at every device node, taken back by the user [S]. */
  static final double REFERENCE = 1e-5;

  /** Stands for an ideal core, which can hold no dc voltage: a hundred-millionth of error [H]. */
  private static final double IDEAL_CORE = 1e9;

  final Circuit circuit;
  final Topology topology;
  final LinearStamper stamper;
  final int harmonics;
  final int[] deviceNode;
  final int size;

  /** By harmonic, by cause, by place of the frame: device nodes first, then drive, then dc. */
  private final double[][][] re;

  private final double[][][] im;
  private final boolean determined;

  HarmonicNetwork(Circuit original, Drive drive, double frequency, int harmonics) {
    this.circuit = withRealCores(original);
    this.topology = new Topology(circuit);
    this.stamper = new LinearStamper(topology, false);
    this.harmonics = harmonics;
    this.deviceNode = new int[topology.deviceNodes];
    for (int node = 0; node < topology.nodeCount; node++) {
      if (topology.row[node] >= 0 && topology.row[node] < deviceNode.length) {
        deviceNode[topology.row[node]] = node;
      }
    }
    ElementValues values = new ElementValues(circuit);
    stamper.stamp(values, new ValveBank(circuit, topology), new JunctionBank(circuit, topology));
    for (int node : deviceNode) {
      stamper.frame.addReal(node, node, REFERENCE);
    }
    this.size = stamper.frame.size;
    int causes = deviceNode.length + 2;
    this.re = new double[harmonics + 1][causes][size];
    this.im = new double[harmonics + 1][causes][size];
    FrameSolver solver = new FrameSolver(topology, stamper);
    boolean all = true;
    for (int h = 0; h <= harmonics && all; h++) {
      all = solver.factor(2 * Math.PI * frequency * h);
      if (all) {
        respond(solver, h, drive, values);
      }
    }
    this.determined = all;
  }

  private static Circuit withRealCores(Circuit original) {
    List<Element> elements = new ArrayList<>();
    for (Element element : original.elements()) {
      boolean ideal = element instanceof Transformer t && Double.isInfinite(t.magnetising());
      elements.add(
          ideal
              ? new Transformer(element.name(), ((Transformer) element).windings(), IDEAL_CORE)
              : element);
    }
    return new Circuit(original.nodes(), elements);
  }

  private void respond(FrameSolver solver, int h, Drive drive, ElementValues values) {
    for (int j = 0; j < deviceNode.length; j++) {
      solver.respondToCurrent(0, deviceNode[j]);
      add(solver, h, j, 1);
    }
    int driven = deviceNode.length;
    drive
        .shares()
        .forEach(
            (source, share) -> {
              solver.respondTo(source);
              add(solver, h, driven, share);
            });
    for (int i = 0; i < circuit.elements().size() && h == 0; i++) {
      Element e = circuit.elements().get(i);
      if (e instanceof VoltageSource || e instanceof CurrentSource) {
        solver.respondTo(i);
        add(solver, 0, driven + 1, values.value[i]);
      }
    }
  }

  private void add(FrameSolver solver, int h, int cause, double factor) {
    for (int place = 0; place < size; place++) {
      re[h][cause][place] += factor * solver.re(place);
      im[h][cause][place] += factor * solver.im(place);
    }
  }

  /** Whether the linear part has a single answer at every harmonic. */
  boolean determined() {
    return determined;
  }

  /** Cause number of the drive; the dc sources come after it. */
  int driveCause() {
    return deviceNode.length;
  }

  double re(int harmonic, int cause, int place) {
    return re[harmonic][cause][place];
  }

  double im(int harmonic, int cause, int place) {
    return im[harmonic][cause][place];
  }
}
