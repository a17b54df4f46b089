package perveance.desktop.view;

import perveance.app.Edit;
import perveance.desktop.viewmodel.Desk;
import perveance.desktop.viewmodel.StageList;
import perveance.plot.PlotFonts;

/** Opens the dialogs in which something is chosen. */
final class Pickers {
  private final Desk desk;
  private final StageList list;
  private final PlotFonts fonts;

  Pickers(Desk desk, StageList list, PlotFonts fonts) {
    this.desk = desk;
    this.list = list;
    this.fonts = fonts;
  }

  void kind() {
    new KindPicker(desk, list, fonts).ask();
  }

  void device() {
    device("");
  }

  void device(String searched) {
    if (desk.bench().chassis().stage(desk.bench().chosenStage().get()).isPresent()) {
      new DevicePicker(desk, fonts, searched).ask();
    }
  }

  void title() {
    desk.asking()
        .word("Title of the chassis", desk.bench().chassis().title())
        .ifPresent(t -> desk.bench().edit(new Edit.SetTitle(t)));
  }

  void conditions() {
    new ConditionsDialog(desk).ask();
  }

  void settings() {
    new SettingsDialog(desk).ask();
  }
}
