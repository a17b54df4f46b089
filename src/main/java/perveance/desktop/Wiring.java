package perveance.desktop;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.function.UnaryOperator;
import javafx.beans.property.ObjectProperty;
import javafx.beans.property.SimpleObjectProperty;
import perveance.desktop.viewmodel.Asking;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.Desks;
import perveance.desktop.viewmodel.Document;
import perveance.desktop.viewmodel.Documents;
import perveance.desktop.viewmodel.Engine;
import perveance.desktop.viewmodel.PointDrag;
import perveance.desktop.viewmodel.Settings;
import perveance.desktop.viewmodel.Starters;
import perveance.desktop.viewmodel.Workbench;
import perveance.engine.stage.Chassis;
import perveance.files.device.DeviceFiles;

/** Puts a desk together: the one place where ports meet their adapters. */
final class Wiring {
  private Wiring() {}

  static Desk desk(Path home, ObjectProperty<Settings> settings, Asking asking, Desks desks) {
    return desk(home, UnaryOperator.identity(), settings, asking, desks);
  }

  /** With an engine that is looked at or added to on its way to the window. */
  static Desk desk(
      Path home,
      UnaryOperator<Engine> around,
      ObjectProperty<Settings> settings,
      Asking asking,
      Desks desks) {
    DeviceFiles devices = devices(home);
    Chassis first = Starters.example(settings.get());
    Workbench bench = new Workbench(first, around.apply(new EngineRoom(devices)), desks);
    keepSaying(bench, String.join("; ", devices.warnings()));
    Documents documents = new FileDocuments(devices, home);
    Documents.Opened opened = new Documents.Opened(Optional.empty(), "", false, first);
    return new Desk(
        bench,
        new Document(bench, documents, opened),
        settings,
        new SheetPress(),
        asking,
        new PointDrag(bench, desks.quick(), desks.foreground()));
  }

  /** The person's own device files, then those of the program. */
  static DeviceFiles devices(Path home) {
    return new DeviceFiles(List.of(home.resolve("devices"), DeviceFiles.usualFolder()));
  }

  /** Says something at the foot whenever nothing else is said there. */
  private static void keepSaying(Workbench bench, String notice) {
    bench.say(notice);
    bench
        .message()
        .addListener(
            (o, was, is) -> {
              if (is.isEmpty() && !notice.isEmpty()) {
                bench.say(notice);
              }
            });
  }

  static ObjectProperty<Settings> settings(Path home) {
    SettingsFile file = new SettingsFile(home);
    ObjectProperty<Settings> settings = new SimpleObjectProperty<>(file.load());
    settings.addListener((o, was, is) -> file.save(is));
    return settings;
  }
}
