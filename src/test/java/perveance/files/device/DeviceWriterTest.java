package perveance.files.device;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import perveance.engine.base.BadInputException;
import perveance.engine.device.Device;
import perveance.engine.device.DeviceLaw;
import perveance.engine.device.FitSummary;
import perveance.engine.device.LawParameter;
import perveance.engine.device.SpreadTriodeLaw;
import perveance.files.toml.SourceText;

/** Writing a device file and reading it again gives the same device. */
class DeviceWriterTest {
  static Stream<Path> ours() throws IOException {
    return DeviceFilesTest.tomlFiles(Path.of("device-curves")).stream();
  }

  /** Parameters are written to eight figures, so to half a unit of the eighth they are the same. */
  private static void assertSameLaw(DeviceLaw expected, DeviceLaw found, String text) {
    assertEquals(expected.kind(), found.kind());
    assertEquals(expected.parameters().size(), found.parameters().size());
    for (int i = 0; i < expected.parameters().size(); i++) {
      LawParameter a = expected.parameters().get(i);
      LawParameter b = found.parameters().get(i);
      assertEquals(a.key(), b.key());
      assertEquals(a.value(), b.value(), 1e-7 * Math.abs(a.value()), text);
    }
  }

  private static void assertSame(Device expected, Device found, String text) {
    assertSameLaw(expected.law(), found.law(), text);
    Device sameLaw =
        new Device(
            found.type(),
            found.aliases(),
            found.sections(),
            found.base(),
            found.pins(),
            found.heaters(),
            found.ratings(),
            found.capacitances(),
            found.evidence(),
            expected.law(),
            found.fit(),
            found.validity(),
            found.notes(),
            found.rectifier(),
            found.beam());
    assertEquals(expected, sameLaw, text);
    assertEquals(List.copyOf(expected.pins().keySet()), List.copyOf(found.pins().keySet()), text);
  }

  @ParameterizedTest
  @MethodSource("ours")
  void everyFileOfOursIsTheSameAfterwards(Path path) throws BadInputException {
    SourceText source = SourceText.read(path);
    Device device = DeviceReader.read(source);
    DeviceSheet sheet = DeviceReader.readSheet(source);
    String fresh = DeviceWriter.fresh(sheet, device.law(), device.fit(), device.validity());
    assertSame(device, DeviceReader.read(SourceText.of("fresh.toml", fresh)), fresh);
    String updated = DeviceWriter.update(source, device.law(), device.fit(), device.validity());
    assertSame(device, DeviceReader.read(SourceText.of("new.toml", updated)), updated);
    // what is not the law's stays to the letter
    assertEquals(
        source.text().substring(0, source.text().indexOf("[law]")),
        updated.substring(0, updated.indexOf("[law]")));
  }

  @Test
  void aLawIsAddedToAFileOfEvidence() throws BadInputException {
    Device device = DeviceReader.read(SourceText.read(Path.of("device-curves", "12ax7.toml")));
    String draft =
        "perveance_device = 1 # mine\ntype = \"M1\"\nkind = \"triode\"\n\n# measured in May\n"
            + "[[evidence]]\nanode_voltage = \"250 V\"\nanode_current = \"1 mA\"\nsource = \"me\"";
    FitSummary fit = new FitSummary("by hand", 0.01, 0.02, List.of(1e-5, 0.5), List.of("a \"b\""));
    String text =
        DeviceWriter.update(SourceText.of("m1.toml", draft), device.law(), fit, device.validity());
    assertTrue(text.startsWith(draft + "\n\n[law]\nname = \"spread-triode\"\n"), text);
    Device mine = DeviceReader.read(SourceText.of("m1.toml", text));
    assertEquals(fit, mine.fit());
    assertSameLaw(device.law(), mine.law(), text);
  }

  @Test
  void aLawOfAnotherNameLeavesNoKeyOfTheOld() throws BadInputException {
    Device device = DeviceReader.read(SourceText.read(Path.of("device-curves", "12ax7.toml")));
    String old =
        "perveance_device = 1\ntype = \"M1\"\nkind = \"triode\"\n[law] # theirs\n"
            + "name = \"spread-pentode\"\nknee = 3 # old\nspread = 0.1 # kept\n"
            + "[validity]\ngrid_voltage = [1, 2]\n";
    String text =
        DeviceWriter.update(
            SourceText.of("m1.toml", old), device.law(), device.fit(), device.validity());
    Device mine = DeviceReader.read(SourceText.of("m1.toml", text));
    assertTrue(mine.law() instanceof SpreadTriodeLaw);
    assertTrue(!text.contains("knee") && text.contains("# kept"), text);
  }
}
