package perveance.report;

import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import perveance.app.wording.FigureRow;
import perveance.app.wording.FindingLine;
import perveance.app.wording.FindingLines;
import perveance.app.wording.LimitRows;
import perveance.app.wording.StageFigures;
import perveance.engine.analysis.ChassisAnswer;
import perveance.engine.analysis.StageAnswer;
import perveance.plot.Artwork;
import perveance.plot.ChartFactory;
import perveance.plot.Look;
import perveance.plot.PlotFonts;
import perveance.plot.SchematicPainter;
import perveance.plot.SchematicText;
import perveance.plot.SchematicWords;
import perveance.plot.StagePlots;

/** Everything the sheet says about one stage, in measuring order. */
final class StageStrip {
  private static final double SIZE = 9;
  private static final double TALLEST = 250;

  /** Smallest type that is aimed at on paper, in points. */
  private static final double READABLE = 6.2;

  private final Typeface faces;
  private final SheetOptions options;
  private final ChassisAnswer chassis;
  private final StageAnswer stage;
  private final Rectangle2D extent;
  private final Artwork schematic;
  private final Optional<Artwork> plot;

  StageStrip(Typeface faces, SheetOptions options, ChassisAnswer chassis, StageAnswer stage) {
    this.faces = faces;
    this.options = options;
    this.chassis = chassis;
    this.stage = stage;
    PlotFonts fonts = new PlotFonts();
    SchematicPainter painter = new SchematicPainter(Look.PAPER, fonts);
    SchematicText text = new SchematicWords(chassis, stage, true).text(Set.of(), options.zigzag());
    this.extent = painter.extent(stage.drawing(), text);
    this.schematic = Artwork.of(painter, stage.drawing(), text, 8.6, READABLE);
    this.plot =
        StagePlots.characteristics(stage)
            .map(p -> Artwork.of(new ChartFactory(Look.PAPER, fonts, 8).chart(p)));
  }

  Block heading() {
    return new TextBlock(
        faces, stage.ref(), say(stage.kind().replace('-', ' ')), 12, Ink.BLACK, false, 4);
  }

  /**
   * Schematic with the characteristics beside it; a wide schematic stands alone.
   *
   * @param slack height that the page has to spare, used for larger pictures in points [1]
   */
  Block pictures(double slack) {
    if (wide()) {
      double tall = Math.min(250 + slack, 500 * extent.getHeight() / extent.getWidth() + 8);
      return new PicturePair(List.of(schematic), new double[] {1}, tall);
    }
    List<Artwork> pictures = new ArrayList<>(List.of(schematic));
    plot.ifPresent(pictures::add);
    double[] shares = pictures.size() == 1 ? new double[] {1} : new double[] {0.58, 0.42};
    return new PicturePair(pictures, shares, Math.min(TALLEST, 188 + slack));
  }

  /** Beside the characteristics a schematic wider than this would have text too small to read. */
  private boolean wide() {
    return extent.getWidth() > 48;
  }

  /** Groups that are kept together on a page. */
  List<List<Block>> groups() {
    List<List<Block>> groups = new ArrayList<>();
    ReadingRows readings = new ReadingRows(faces, options, chassis, stage);
    groups.add(readings.opening());
    readings.rows().forEach(r -> groups.add(List.of(r)));
    groups.add(readings.sums());
    groups.addAll(figuresAndParts());
    groups.add(limits());
    groups.addAll(findings());
    groups.add(assumptions());
    return groups;
  }

  List<Block> spareRows() {
    return new ReadingRows(faces, options, chassis, stage).spare();
  }

  private List<List<Block>> figuresAndParts() {
    List<Block> figures = new ArrayList<>();
    figures.add(headline("What it should do"));
    StageFigures.signal(stage).forEach(row -> figures.add(figure(row)));
    List<Block> rows = new ArrayList<>();
    stage.parts().forEach(duty -> rows.add(PartRows.of(faces, options, duty)));
    rows.addAll(PartRows.valves(faces, options, chassis, stage));
    Block head = headline("Parts to buy");
    if (!wide()) {
      rows.add(0, head);
      return List.of(List.of(new Columns(new double[] {0.53, 0.47}, List.of(figures, rows))));
    }
    int half = (rows.size() + 1) / 2;
    List<List<Block>> groups = new ArrayList<>();
    List<Block> right =
        plot.<List<Block>>map(p -> List.of(new PicturePair(List.of(p), new double[] {1}, 190)))
            .orElse(List.of());
    groups.add(List.of(new Columns(new double[] {0.5, 0.5}, List.of(figures, right))));
    groups.add(
        List.of(
            head,
            new Columns(
                new double[] {0.5, 0.5},
                List.of(rows.subList(0, half), rows.subList(half, rows.size())))));
    return groups;
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

  /** Limits in two columns, the rating system once where all share it. */
  private List<Block> limits() {
    List<FigureRow> found = LimitRows.of(stage);
    if (found.isEmpty()) {
      return List.of(new TextBlock(faces, "Limits", "none known for this valve", SIZE, Ink.BLACK));
    }
    boolean shared = found.stream().map(FigureRow::note).distinct().count() == 1;
    String system = shared ? ", " + found.get(0).note() : "";
    List<Block> rows = found.stream().map(r -> limit(r, shared ? "" : " " + r.note())).toList();
    int half = (rows.size() + 1) / 2;
    return List.of(
        headline("Limits, the maker's" + system),
        new Columns(
            new double[] {0.5, 0.5},
            List.of(rows.subList(0, half), rows.subList(half, rows.size()))));
  }

  private Block limit(FigureRow row, String system) {
    return new RowBlock(
        faces,
        new double[] {0.52, 0.48},
        List.of(Cell.soft(say(row.label())), Cell.bold(row.value() + ", " + row.band() + system)),
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
    for (FindingLine line : FindingLines.of(stage.findings())) {
      Block text = new TextBlock(faces, line.word(), say(line.told()), SIZE, Ink.BLACK);
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
    return new Spaced(6, new TextBlock(faces, "", text, 10.5, Ink.BLACK, true, 3));
  }

  private String say(String text) {
    return options.vocabulary().say(text);
  }
}
