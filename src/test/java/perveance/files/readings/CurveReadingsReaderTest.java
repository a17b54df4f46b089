package perveance.files.readings;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import perveance.engine.base.BadInputException;
import perveance.engine.base.Problem;
import perveance.engine.device.Evidence;
import perveance.files.toml.SourceText;

/** Readings as spreadsheets and curve tracers write them. */
class CurveReadingsReaderTest {
  private static CurveReadings read(String text) throws BadInputException {
    return CurveReadingsReader.read(SourceText.of("r.csv", text));
  }

  private static List<String> problems(String text) {
    BadInputException refusal = assertThrows(BadInputException.class, () -> read(text), text);
    return refusal.problems().stream().map(Problem::message).toList();
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "Va,Vg,Ia (mA)\n250,-2,1.2\n100,-1,0.5\n",
        "Va (V); Vg (V); Ia (mA)\n250;-2;1,2\n100;-1;0,5\n",
        "Va\tVg1\tIa [mA]\n250\t-2\t1,2\n100\t-1\t0.5",
        "# my 12AX7\n\nva/V,vg/V,ia/uA\n250,-2,1200\n# again\n100,-1,500\n",
        "Ia_mA;Plate Voltage;grid_voltage\r\n1.2;250;-2\r\n0.5;100;-1\r\n",
        "\"Ua (V)\",\"Ug (V)\",\"Ia (A)\"\n\"250\",\"-2\",\"1.2e-3\"\n\"100\",\"-1\",\"5E-4\"\n",
        "Va,Vg,Ia\n250 V,-2 V,1.2 mA\n0.1 kV,-1,500 uA\n",
        "perveance_readings = 1\n[[reading]]\nanode_voltage = 250\ngrid_voltage = \"-2 V\"\n"
            + "anode_current = \"1.2 mA\"\n[[reading]]\nanode_voltage = \"100 V\"\n"
            + "grid_voltage = -1\nanode_current = 0.5e-3\n"
      })
  void theSameReadingsInManyForms(String text) throws BadInputException {
    List<Evidence> evidence = read(text).evidence();
    assertEquals(2, evidence.size());
    assertReading(evidence.get(0), 250, -2, 1.2e-3);
    assertReading(evidence.get(1), 100, -1, 0.5e-3);
  }

  private static void assertReading(Evidence e, double anode, double grid, double current) {
    assertEquals(anode, e.anodeVoltage());
    assertEquals(OptionalDouble.of(grid), e.gridVoltage());
    assertEquals(current, e.anodeCurrent().orElseThrow(), 1e-18);
    assertEquals("triode", e.connection());
    assertEquals("measured", e.how());
    assertTrue(e.fit());
  }

  @Test
  void aPentodeHasAScreenAndADiodeNoGrid() throws BadInputException {
    Evidence pentode = read("Va;Vg2;Vg;Ia (mA);Ig2 (mA)\n250;250;-6;44;\n").evidence().get(0);
    assertEquals("pentode", pentode.connection());
    assertEquals(250, pentode.screenVoltage().orElseThrow());
    assertTrue(pentode.screenCurrent().isEmpty());
    assertEquals("diode", read("Va,Ia (mA)\n17,225\n").evidence().get(0).connection());
  }

  @Test
  void aTomlFileMayNameTheDevice() throws BadInputException {
    CurveReadings readings =
        read(
            "perveance_readings = 1\ndevice = \"ECC83\"\n[[reading]]\nanode_voltage = 250\n"
                + "anode_current = 0\nnote = \"cold\"\n");
    assertEquals(Optional.of("ECC83"), readings.device());
    assertEquals("cold", readings.evidence().get(0).note());
  }

  @Test
  void everySlipIsToldWithItsLine() {
    assertEquals(
        List.of(
            "r.csv:2: anode_current: found \"1.2 V\", expected a current in amperes (A), for"
                + " example \"1.5 mA\"",
            "r.csv:3: found 4 values, expected 3 values; with decimal commas separate the columns"
                + " by semicolons",
            "r.csv:4: anode_voltage: found \"x\", expected a voltage in volts (V), for example"
                + " \"300 V\"",
            "r.csv:4: anode_current: found \"-1\", expected a current from 0 A to 1000 A",
            "r.csv:6: anode_current: found nothing, expected a figure"),
        problems("Va,Vg,Ia (mA)\n250,-2,1.2 V\n250,-2,1,2\nx,-2,-1\n250,-2,1\n250,-2,\n"));
  }

  @Test
  void aHeaderIsToldWhatIsWrongWithIt() {
    assertEquals(
        List.of(
            "r.csv:1: header: found \"Va (mA)\", expected a unit of voltage, such as V",
            "r.csv:1: header: found \"anode_curent (mA)\", expected Va, Vg, Ia, Vg2 or Ig2 with its"
                + " unit, such as \"Ia (mA)\"; did you mean \"anode_current\"?",
            "r.csv:1: header: found a column without a name, expected Va, Vg, Ia, Vg2 or Ig2 with"
                + " its unit, such as \"Ia (mA)\""),
        problems("Va (mA);anode_curent (mA);\n1;2;3\n"));
    assertEquals(
        List.of("r.csv:1: header: found no anode_current, expected columns Va and Ia at least"),
        problems("Va,Vg\n1,2\n"));
    assertTrue(problems("Va,Ia (A),Va\n1,1,1\n").get(0).contains("\"Va\" a second time"));
    assertTrue(problems("").get(0).contains("found no header"));
    assertTrue(problems("Va,Ia (mA)\n\n").get(0).contains("found no readings"));
  }

  @Test
  void aCurrentWithoutAUnitIsNotGuessed() {
    assertEquals(
        List.of(
            "r.csv:2: anode_current: found \"1.2\" without a unit, expected a unit in the header,"
                + " such as \"Ia (mA)\", or behind the figure"),
        problems("Va,Vg,Ia\n250,-2,1.2\n"));
  }

  @Test
  void damagedTablesAreReadOrRefused() {
    String sound = "Va (V);Vg (V);Ia (mA)\n250;-2;1,2\n100;-1;0,5\n";
    String pieces = ";,\t\n\"#()[]/ _eE+-.0123456789mAVkg\u00B5\u0007";
    Random random = new Random(7);
    int read = 0;
    for (int i = 0; i < 5000; i++) {
      StringBuilder text = new StringBuilder(sound);
      int edits = 1 + random.nextInt(3);
      for (int edit = 0; edit < edits; edit++) {
        int at = random.nextInt(text.length());
        text.replace(
            at,
            at + random.nextInt(2),
            String.valueOf(pieces.charAt(random.nextInt(pieces.length()))));
      }
      try {
        for (Evidence e : read(text.toString()).evidence()) {
          assertTrue(Double.isFinite(e.anodeVoltage() + e.anodeCurrent().orElseThrow()));
        }
        read++;
      } catch (BadInputException e) {
        assertTrue(e.problems().stream().allMatch(p -> p.line().isPresent()), text.toString());
      }
    }
    assertTrue(read > 100, read + " tables were read");
  }
}
