package perveance.reference;

import static org.junit.jupiter.api.Assertions.assertInstanceOf;

import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.Complex;
import perveance.engine.circuit.DcOutcome;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.DcSolver;
import perveance.engine.circuit.Drive;
import perveance.engine.circuit.MidbandOutcome;
import perveance.engine.circuit.MidbandSolution;
import perveance.engine.circuit.MidbandSolver;
import perveance.engine.circuit.SmallSignal;
import perveance.engine.circuit.ValvePoint;
import perveance.engine.circuit.Waveform;
import perveance.engine.numeric.Harmonics;

/** What our engine says of a case. */
final class EngineAnswers {
  private static final String[] ELECTRODES = {"anode", "grid", "screen"};

  private EngineAnswers() {}

  static DcSolution rest(ReferenceCase c) {
    DcOutcome outcome = new DcSolver(c.circuit()).solve();
    return assertInstanceOf(DcOutcome.Converged.class, outcome, c.name()).solution();
  }

  static MidbandSolution cycle(ReferenceCase c, DcSolution rest) {
    Waveform cosine = Waveform.cosine(ReferenceCase.SAMPLES);
    Drive drive = Drive.of(cosine, c.circuit().element(c.input()));
    MidbandOutcome outcome = new MidbandSolver(rest, drive).solve(c.peak());
    return assertInstanceOf(MidbandOutcome.Converged.class, outcome, c.name()).solution();
  }

  static Answers of(ReferenceCase c) {
    Answers answers = new Answers();
    Circuit circuit = c.circuit();
    DcSolution rest = rest(c);
    for (int node = 1; node < circuit.nodes().size(); node++) {
      answers.put(Answers.voltage(circuit.nodes().get(node)), rest.voltage(node));
    }
    for (ValvePoint valve : rest.valves()) {
      for (int e = 0; e < ELECTRODES.length; e++) {
        answers.put(Answers.current(valve.name(), ELECTRODES[e]), valve.current(e));
      }
    }
    SmallSignal signals = new SmallSignal(rest);
    MidbandSolution cycle = cycle(c, rest);
    int input = circuit.element(c.input());
    for (ReferenceCase.Output out : c.outputs()) {
      for (double frequency : c.frequencies()) {
        Complex gain = signals.transfer(input, out.plus(), out.minus(), frequency);
        answers.put(Answers.signal(out.name(), frequency, "re"), gain.re());
        answers.put(Answers.signal(out.name(), frequency, "im"), gain.im());
      }
      Harmonics harmonics = cycle.harmonics(out.plus(), out.minus());
      for (int n = 1; n <= ReferenceCase.HARMONICS; n++) {
        answers.put(Answers.harmonic(out.name(), n), harmonics.cosine(n));
      }
    }
    return answers;
  }
}
