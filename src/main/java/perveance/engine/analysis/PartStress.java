package perveance.engine.analysis;

import perveance.engine.circuit.Circuit;
import perveance.engine.circuit.DcSolution;
import perveance.engine.circuit.Element;
import perveance.engine.circuit.Element.Capacitor;
import perveance.engine.circuit.Element.CurrentSource;
import perveance.engine.circuit.Element.Inductor;
import perveance.engine.circuit.Element.Junction;
import perveance.engine.circuit.Element.Resistor;
import perveance.engine.circuit.Element.Transformer;
import perveance.engine.circuit.Element.VoltageSource;

/**
 * What a part bears in one state of the circuit.
 *
 * @param voltage magnitude across it [V]
 * @param power taken by it [W]
 */
record PartStress(double voltage, double power) {
  /** Reads the stress of an element off a dc solution. */
  static PartStress of(DcSolution dc, String element) {
    Circuit circuit = dc.circuit();
    Element part = circuit.elements().get(circuit.element(element));
    int a = 0;
    int b = 0;
    if (part instanceof Resistor e) {
      a = e.a();
      b = e.b();
    } else if (part instanceof Capacitor e) {
      a = e.a();
      b = e.b();
    } else if (part instanceof Inductor e) {
      a = e.a();
      b = e.b();
    } else if (part instanceof Junction e) {
      a = e.anode();
      b = e.cathode();
    } else if (part instanceof VoltageSource e) {
      a = e.plus();
      b = e.minus();
    } else if (part instanceof CurrentSource e) {
      a = e.from();
      b = e.to();
    } else if (part instanceof Transformer e) {
      a = e.windings().get(0).start();
      b = e.windings().get(0).end();
    }
    return new PartStress(Math.abs(dc.voltage(a) - dc.voltage(b)), Math.abs(dc.power(element)));
  }
}
