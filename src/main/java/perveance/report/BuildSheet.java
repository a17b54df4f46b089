package perveance.report;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.GregorianCalendar;
import java.util.List;
import java.util.TimeZone;
import java.util.TreeSet;
import perveance.app.wording.SafetyBox;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.stage.StageCircuit;

/**
 * The build sheet: cautions first, then what is needed at the bench in measuring order. Black on
 * white, vector throughout, PDF/A-2b.
 */
public final class BuildSheet {
  /** Room that the rows for other readings take [1]. */
  private static final double SPARE_ROWS = 130;

  private final SheetOptions options;

  /**
   * A sheet maker.
   *
   * @param options paper, words, date
   */
  public BuildSheet(SheetOptions options) {
    this.options = options;
  }

  /**
   * Lays out and renders the sheet.
   *
   * @param answer the chassis' answer
   * @return the PDF file
   */
  public byte[] render(ChassisAnswer answer) {
    try (Sheet sheet = new Sheet(options.paper())) {
      SheetHead head = new SheetHead(sheet.faces(), options, answer);
      sheet.add(head.title());
      sheet.add(new SafetyBlock(sheet.faces(), say(SafetyBox.of(answer))));
      for (Block block : head.conditions()) {
        sheet.add(block);
      }
      boolean first = true;
      for (StageAnswer stage : answer.stages()) {
        strip(sheet, answer, stage, first);
        first = false;
      }
      for (Block block : head.failures()) {
        sheet.add(block);
      }
      String title = "Build sheet: " + answer.chassis().title();
      Archive.describe(sheet.document(), title, subject(answer), date());
      return sheet.finish(answer.chassis().title(), foot(answer));
    } catch (IOException e) {
      throw new UncheckedIOException("cannot make the sheet", e);
    }
  }

  private void strip(Sheet sheet, ChassisAnswer answer, StageAnswer stage, boolean first)
      throws IOException {
    StageStrip strip = new StageStrip(sheet.faces(), options, answer, stage);
    if (!first) {
      sheet.newPage();
    }
    List<Block> opening = new ArrayList<>();
    if (answer.stages().size() > 1) {
      opening.add(strip.heading());
    }
    opening.add(strip.pictures(0));
    List<List<Block>> groups = strip.groups();
    double slack = sheet.slack(opening, groups) - (sheet.fits(opening, groups) ? SPARE_ROWS : 0);
    opening.set(opening.size() - 1, strip.pictures(Math.max(0, slack)));
    sheet.addTogether(opening);
    for (List<Block> group : groups) {
      sheet.addTogether(group);
    }
    if (sheet.room() > SPARE_ROWS) {
      sheet.addTogether(strip.spareRows());
    }
  }

  private SafetyBox say(SafetyBox box) {
    return new SafetyBox(
        box.signal(),
        box.headline(),
        box.consequence(),
        box.steps().stream().map(options.vocabulary()::say).toList(),
        options.vocabulary().say(box.footer()));
  }

  private GregorianCalendar date() {
    TimeZone zone = TimeZone.getTimeZone(ZoneId.of("UTC"));
    GregorianCalendar calendar = new GregorianCalendar(zone);
    calendar.clear();
    calendar.set(
        options.date().getYear(),
        options.date().getMonthValue() - 1,
        options.date().getDayOfMonth());
    return calendar;
  }

  private static String subject(ChassisAnswer answer) {
    TreeSet<String> stages = new TreeSet<>();
    answer.stages().forEach(s -> stages.add(s.ref() + " " + s.kind()));
    return "Expected readings, parts and cautions for " + String.join(", ", stages);
  }

  private List<String> foot(ChassisAnswer answer) {
    TreeSet<String> types = new TreeSet<>();
    for (StageAnswer stage : answer.stages()) {
      for (StageCircuit.StageDevice d : stage.circuit().devices()) {
        types.add(
            d.device().type()
                + d.device()
                    .defaultRatings()
                    .map(r -> " (limits " + r.system().word() + ", " + r.source() + ")")
                    .orElse(" (no limits known)"));
      }
    }
    return List.of(
        options
            .vocabulary()
            .say(
                "Typical valve from published data: "
                    + String.join("; ", types)
                    + ". Figures are indications under the stated conditions for qualified persons;"
                    + " they prove neither a valve nor a chassis. Perveance "
                    + options.version()
                    + "."));
  }
}
