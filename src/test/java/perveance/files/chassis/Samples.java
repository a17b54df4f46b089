package perveance.files.chassis;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;
import perveance.engine.base.BadInputException;
import perveance.engine.stage.Chassis;
import perveance.files.device.DeviceFiles;
import perveance.files.toml.SourceText;

/** Chassis files for the tests of this package. */
final class Samples {
  static final DeviceFiles LIBRARY = new DeviceFiles(List.of());

  static final String THREE_STAGES = text("three-stages.toml");

  private Samples() {}

  static Chassis read(String text) throws BadInputException {
    return new ChassisReader(LIBRARY).read(SourceText.of("amp.toml", text));
  }

  private static String text(String name) {
    try (InputStream in = Samples.class.getResourceAsStream(name)) {
      return new String(Objects.requireNonNull(in, name).readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
