package perveance.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import perveance.app.wording.FigureRow;
import perveance.app.wording.LimitRows;
import perveance.app.wording.StageFigures;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.PartDuty;
import perveance.engine.analysis.StageAnswer;
import perveance.engine.base.Finding;
import perveance.plot.Artwork;
import perveance.plot.ChartFactory;
import perveance.plot.Look;
import perveance.plot.PlotFonts;
import perveance.plot.SchematicPainter;
import perveance.plot.SchematicWords;
import perveance.plot.StagePlots;

/** Everything the sheet says about one stage, in measuring order. */
final class StageStrip {
  private static final double SIZE = 9;

  private final Typeface faces;
  private final SheetOptions options;
  private final ChassisAnswer chassis;
  private final StageAnswer stage;

  StageStrip(Typeface faces, SheetOptions options, ChassisAnswer chassis, StageAnswer stage) {
    this.faces = faces;
    this.options = options;
    this.chassis = chassis;
    this.stage = stage;
  }

  Block heading() {
    return new TextBlock(
        faces, stage.ref(), say(stage.kind().replace('-', ' ')), 12, Ink.BLACK, false, 4);
  }

  /** Schematic and characteristics. */
  Block pictures() {
    PlotFonts fonts = new PlotFonts();
    Artwork schematic =
        Artwork.of(
            new SchematicPainter(Look.PAPER, fonts),
            stage.drawing(),
            new SchematicWords(chassis, stage, true).text(Set.of(), options.zigzag()),
            8.6);
    List<Artwork> pictures = new ArrayList<>(List.of(schematic));
    StagePlots.characteristics(stage)
        .ifPresent(
            plot -> pictures.add(Artwork.of(new ChartFactory(Look.PAPER, fonts, 8).chart(plot))));
    double[] shares = pictures.size() == 1 ? new double[] {1} : new double[] {0.58, 0.42};
    return new PicturePair(pictures, shares, 206);
  }

  /** Groups that are kept together on a page. */
  List<List<Block>> groups() {
    List<List<Block>> groups = new ArrayList<>();
    ReadingRows readings = new ReadingRows(faces, options, chassis, stage);
    groups.add(readings.opening());
    readings.rows().forEach(r -> groups.add(List.of(r)));
    groups.add(readings.sums());
    groups.add(List.of(figuresAndParts()));
    groups.add(limits());
    groups.addAll(findings());
    groups.add(assumptions());
    return groups;
  }

  List<Block> spareRows() {
    return new ReadingRows(faces, options, chassis, stage).spare();
  }

  private Block figuresAndParts() {
    List<Block> figures = new ArrayList<>();
    figures.add(headline("What it should do"));
    for (FigureRow row : StageFigures.signal(stage)) {
      figures.add(figure(row));
    }
    List<Block> parts = new ArrayList<>();
    parts.add(headline("Parts to buy"));
    for (PartDuty duty : stage.parts()) {
      parts.add(PartRows.of(faces, options, duty));
    }
    parts.addAll(PartRows.valves(faces, options, stage));
    return new Columns(new double[] {0.47, 0.53}, List.of(figures, parts));
  }

  private Block figure(FigureRow row) {
    String band = row.band().isEmpty() ? "" : " (" + row.band() + ")";
    String note = row.note().isEmpty() ? "" : ", " + row.note();
    return new RowBlock(
        faces,
        new double[] {0.34, 0.66},
        List.of(Cell.soft(say(row.label())), Cell.bold(row.value() + band + say(note))),
        SIZE,
        13,
        0);
  }

  /** Limits in two columns. */
  private List<Block> limits() {
    List<Block> rows = LimitRows.of(stage).stream().map(this::limit).toList();
    int half = (rows.size() + 1) / 2;
    return rows.isEmpty()
        ? List.of(new TextBlock(faces, "Limits", "none known for this valve", SIZE, Ink.BLACK))
        : List.of(
            headline("Limits, the maker's"),
            new Columns(
                new double[] {0.5, 0.5},
                List.of(rows.subList(0, half), rows.subList(half, rows.size()))));
  }

  private Block limit(FigureRow row) {
    return new RowBlock(
        faces,
        new double[] {0.4, 0.6},
        List.of(
            Cell.soft(say(row.label())),
            Cell.bold(row.value() + ", " + row.band() + " (" + row.note() + ")")),
        8.5,
        12,
        0);
  }

  private List<List<Block>> findings() {
    List<List<Block>> groups = new ArrayList<>();
    Block head = headline("Findings");
    if (stage.findings().isEmpty()) {
      return List.of(
          List.of(head, new TextBlock(faces, "", "None within this file.", SIZE, Ink.BLACK)));
    }
    for (Finding finding : stage.findings()) {
      String remedy = finding.remedy().map(r -> " Remedy: " + r.text()).orElse("");
      Block text =
          new TextBlock(
              faces,
              finding.severity().name().replace('_', ' '),
              say(finding.text() + remedy),
              SIZE,
              Ink.BLACK);
      groups.add(groups.isEmpty() ? List.of(head, text) : List.of(text));
    }
    return groups;
  }

  private List<Block> assumptions() {
    List<Block> blocks = new ArrayList<>();
    if (!stage.assumptions().isEmpty()) {
      blocks.add(headline("Assumptions"));
      blocks.add(new TextBlock(faces, "", say(String.join(" ", stage.assumptions())), 8, Ink.SOFT));
    }
    return blocks;
  }

  private Block headline(String text) {
    return new TextBlock(faces, "", text, 10.5, Ink.BLACK, true, 3);
  }

  private String say(String text) {
    return options.vocabulary().say(text);
  }
}
