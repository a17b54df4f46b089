package perveance.engine.stage;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import java.util.List;
import org.junit.jupiter.api.Test;

/** Every way in which a chassis can be wrong is told, with its place and what would do. */
class ChassisChecksTest {
  private static ChassisBench bench() {
    return new ChassisBench().device("12AX7", YardstickTriode.T12AX7).supply("A", 300);
  }

  private static ChassisBench stage(ChassisBench bench, String ref, Object... more) {
    Object[] keys = {
      "device", "12AX7", "supply", "A", "anode_load", 100e3, "cathode_resistor", 1500
    };
    Object[] all = java.util.Arrays.copyOf(keys, keys.length + more.length);
    System.arraycopy(more, 0, all, keys.length, more.length);
    return bench.stage(ref, "common-cathode", all);
  }

  @Test
  void soundChassisHasNoComplaint() {
    assertEquals(List.of(), stage(bench(), "V1").complaints());
  }

  @Test
  void unknownNamesAreToldWithTheNearest() {
    ChassisBench bench =
        bench()
            .stage("V1", "comon-cathode")
            .stage(
                "V2",
                "common-cathode",
                "device",
                "12AX8",
                "supply",
                "B",
                "anode_load",
                1e5,
                "grid_leak",
                1e6,
                "drives",
                "V9");
    assertEquals(
        List.of(
            "stage V1 kind: found \"comon-cathode\", expected one of "
                + String.join(", ", StageKinds.all().stream().map(StageKind::name).toList())
                + "; did you mean \"common-cathode\"?",
            "stage V2 device: found \"12AX8\", which no device file names, expected a known valve;"
                + " did you mean \"12AX7\"?",
            "stage V2 supply: found \"B\", which is no supply, expected one of A",
            "stage V2 drives: found \"V9\", which is no other stage, expected the ref of another"
                + " stage; did you mean \"V1\"?"),
        bench.complaints());
  }

  @Test
  void circlesAndSecondDriversAreTold() {
    ChassisBench bench = bench();
    stage(bench, "V1", "drives", "V2");
    stage(bench, "V2", "drives", "V1");
    stage(bench, "V3", "drives", "V2");
    stage(bench, "V4", "drives", "V4");
    String circle = "found stages that drive each other in a circle, expected a chain with an end";
    assertEquals(
        List.of(
            "stage V1 drives: " + circle,
            "stage V2 drives: " + circle,
            "stage V3 drives: found V2, which V1 drives already, expected one driver for a stage",
            "stage V4 drives: found itself, expected the ref of another stage"),
        bench.complaints());
  }

  @Test
  void namesMustBeTheirOwnAndWellFormed() {
    ChassisBench bench = bench().supply("A", 250).supply("b.d", 0);
    stage(stage(bench, "V1"), "V1");
    stage(bench, "V.2", "sections", 2);
    assertEquals(
        List.of(
            "supply A: found a second supply of that name, expected a name of its own",
            "supply b.d: found a supply named \"b.d\", expected " + ChassisNames.FORM,
            "supply b.d voltage: found 0 V, expected a voltage up to 10 kV, not zero",
            "stage V1 ref: found \"V1\", which V1 has, expected a name of its own",
            "stage V.2 ref: found \"V.2\", expected " + ChassisNames.FORM),
        bench.complaints());
  }

  @Test
  void valvesOfAPairHaveNamesOfTheirOwn() {
    ChassisBench bench =
        bench()
            .stage(
                "V1",
                "long-tailed-pair",
                "device",
                "12AX7",
                "supply",
                "A",
                "anode_load",
                100e3,
                "tail_resistor",
                10e3);
    stage(bench, "V1b");
    assertEquals(
        List.of("stage V1b ref: found \"V1b\", which V1 has, expected a name of its own"),
        bench.complaints());
  }

  @Test
  void suppliesMustLeadToAVoltage() {
    ChassisBench bench =
        bench().dropped("B", "C", 10e3).dropped("C", "B", 10e3).dropped("D", "E", 0.001);
    String circle =
        "found supplies that feed each other in a circle, expected a chain that starts at a"
            + " voltage";
    assertEquals(
        List.of(
            "supply B from: " + circle,
            "supply C from: " + circle,
            "supply D dropper: found 0R001, expected a resistance from 0R01 to 1G",
            "supply D from: found \"E\", which is no other supply, expected another supply of the"
                + " chassis"),
        bench.complaints());
  }

  @Test
  void singleKeysAreChecked() {
    ChassisBench bench =
        bench()
            .stage(
                "V1",
                "common-cathode",
                "device",
                "12AX7",
                "anode_load",
                -5,
                "cathode_resistr",
                1500,
                "grid_leak",
                "big",
                "connection",
                "triod",
                "drive",
                Double.NaN);
    assertEquals(
        List.of(
            "stage V1 anode_load: found -5, expected a resistance from 0R01 to 100M",
            "stage V1 cathode_resistr: found an unknown key, expected a key of common-cathode; did"
                + " you mean \"cathode_resistor\"?",
            "stage V1 grid_leak: found \"big\", expected a resistance such as \"4k7\"",
            "stage V1 connection: found \"triod\", expected one of triode, pentode, beam, tetrode,"
                + " ultra-linear; did you mean \"triode\"?",
            "stage V1 drive: found NaN, expected a voltage from 1 uV to 5000 V",
            "stage V1 supply: found nothing, expected supply node that feeds the stage: the name of"
                + " a supply"),
        bench.complaints());
  }

  @Test
  void contradictionsAreTold() {
    ChassisBench bench = bench();
    stage(
        bench,
        "V1",
        "cathode_voltage",
        1.6,
        "anode_current",
        1e-3,
        "screen_resistor",
        1e6,
        "sections",
        1.5);
    stage(bench, "V2", "cathode_diode", "led");
    bench.stage(
        "V3",
        "common-cathode",
        "device",
        "12AX7",
        "supply",
        "A",
        "anode_load",
        1e5,
        "cathode_bypass",
        22e-6);
    assertEquals(
        List.of(
            "stage V1 anode_load: found an anode_load as well as an anode_current, expected either"
                + " an anode_load or an anode_current",
            "stage V1 cathode_voltage: found a diode as well as a cathode_resistor, expected one of"
                + " the two in the cathode",
            "stage V1 screen_resistor: found a screen for a valve that has none, expected no such"
                + " key with a triode",
            "stage V1 sections: found 1.5, expected a whole number of sections",
            "stage V2 cathode_diode: found a diode without its voltage, expected a cathode_voltage"
                + " with it",
            "stage V3 cathode_bypass: found a bypass without a cathode_resistor, expected a"
                + " cathode_resistor for it to bypass",
            "stage V3 grid_leak: found nothing that makes the bias, expected a cathode_resistor, a"
                + " cathode_voltage, a grid_bias, or a grid_leak for grid-leak bias"),
        bench.complaints());
  }

  @Test
  void circuitsRefuseAChassisWithComplaints() {
    ChassisBench bench = bench().stage("V1", "nothing");
    assertThrows(IllegalArgumentException.class, bench::circuits);
  }
}
