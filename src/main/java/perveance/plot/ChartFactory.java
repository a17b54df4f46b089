package perveance.plot;

import java.awt.BasicStroke;
import java.awt.Font;
import java.text.DecimalFormat;
import java.text.DecimalFormatSymbols;
import java.text.NumberFormat;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.LogAxis;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTickUnit;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.DatasetRenderingOrder;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.title.TextTitle;
import org.jfree.chart.ui.HorizontalAlignment;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;

/** Turns a plot description into a chart. The same description serves sheet, window and files. */
public final class ChartFactory {
  private final Look look;
  private final PlotFonts fonts;
  private final double textSize;

  /**
   * A factory for one look.
   *
   * @param look colours
   * @param fonts faces
   * @param textSize size of axis figures in points [1]
   */
  public ChartFactory(Look look, PlotFonts fonts, double textSize) {
    this.look = look;
    this.fonts = fonts;
    this.textSize = textSize;
  }

  /**
   * The chart.
   *
   * @param description what to draw
   * @return a chart without legend: lines are labelled where they run
   */
  public JFreeChart chart(PlotDescription description) {
    return chart(description, labels(description));
  }

  private ChartLabels labels(PlotDescription description) {
    return new ChartLabels(description, look, fonts, textSize);
  }

  private JFreeChart chart(PlotDescription description, ChartLabels labels) {
    XYPlot plot = new XYPlot();
    plot.setDomainAxis(axis(description.x()));
    plot.setRangeAxis(axis(description.y()));
    plot.setBackgroundPaint(look.paper());
    plot.setOutlineVisible(false);
    plot.setDomainGridlinePaint(look.faint());
    plot.setRangeGridlinePaint(look.faint());
    plot.setDomainGridlineStroke(new BasicStroke(0.5f));
    plot.setRangeGridlineStroke(new BasicStroke(0.5f));
    plot.setAxisOffset(new RectangleInsets(2, 2, 2, 2));
    plot.setDatasetRenderingOrder(DatasetRenderingOrder.FORWARD);
    for (int i = 0; i < description.series().size(); i++) {
      PlotSeries series = description.series().get(i);
      plot.setDataset(i, dataset(series));
      plot.setRenderer(i, new SeriesStyle(look).renderer(series.role()));
    }
    plot.addAnnotation(labels);
    JFreeChart chart = new JFreeChart(null, fonts.regular(textSize), plot, false);
    chart.setBackgroundPaint(look.paper());
    chart.setPadding(new RectangleInsets(4, 4, 4, 10));
    return chart;
  }

  /**
   * The chart under its title, for a picture that stands alone.
   *
   * @param description what to draw
   * @return a chart without legend
   */
  public JFreeChart titled(PlotDescription description) {
    JFreeChart chart = chart(description);
    if (!description.title().isEmpty()) {
      TextTitle title = new TextTitle(description.title(), fonts.bold(1.2 * textSize));
      title.setPaint(look.ink());
      title.setHorizontalAlignment(HorizontalAlignment.LEFT);
      title.setPadding(new RectangleInsets(4, 8, 8, 4));
      chart.setTitle(title);
    }
    return chart;
  }

  /**
   * The chart as something that draws itself.
   *
   * @param description what to draw
   * @return artwork that reports the area between its axes and where its texts stand
   */
  public Artwork artwork(PlotDescription description) {
    ChartLabels labels = labels(description);
    Artwork chart = Artwork.of(chart(description, labels));
    return (g, area) -> {
      List<Hotspot> spots = new ArrayList<>(chart.draw(g, area));
      labels.boxes().forEach(box -> spots.add(Hotspot.of(Artwork.TEXT, box)));
      return spots;
    };
  }

  private static XYSeriesCollection dataset(PlotSeries series) {
    XYSeries points = new XYSeries(series.name(), false, true);
    for (PlotPoint p : series.points()) {
      points.add(p.x(), p.y(), false);
    }
    return new XYSeriesCollection(points);
  }

  private ValueAxis axis(PlotAxis description) {
    ValueAxis axis = description.logarithmic() ? logarithmic(description) : linear(description);
    Font figures = fonts.regular(textSize);
    axis.setTickLabelFont(figures);
    axis.setLabelFont(figures);
    axis.setTickLabelPaint(look.ink());
    axis.setLabelPaint(look.soft());
    axis.setAxisLinePaint(look.soft());
    axis.setTickMarkPaint(look.soft());
    axis.setRange(description.low(), description.high());
    return axis;
  }

  private static ValueAxis linear(PlotAxis description) {
    NumberAxis axis = new NumberAxis(description.label());
    double span = description.high() - description.low();
    axis.setTickUnit(new NumberTickUnit(roundStep(span / 5)));
    axis.setAutoRangeIncludesZero(false);
    axis.setNumberFormatOverride(figures());
    return axis;
  }

  /** The same figures everywhere, with a minus as long as a plus. */
  private static NumberFormat figures() {
    DecimalFormatSymbols symbols = DecimalFormatSymbols.getInstance(Locale.ROOT);
    symbols.setMinusSign('\u2212');
    return new DecimalFormat("0.######", symbols);
  }

  private static ValueAxis logarithmic(PlotAxis description) {
    LogAxis axis = new LogAxis(description.label());
    axis.setBase(10);
    axis.setTickUnit(new NumberTickUnit(1));
    axis.setMinorTickMarksVisible(true);
    axis.setMinorTickCount(9);
    axis.setNumberFormatOverride(new DecadeFormat());
    return axis;
  }

  /**
   * Smallest step of 1, 2 or 5 times a power of ten that is not below the wanted one.
   *
   * @param wanted in axis units, above zero [1]
   * @return step in axis units [1]
   */
  static double roundStep(double wanted) {
    double decade = Math.pow(10, Math.floor(Math.log10(wanted)));
    for (double nice : new double[] {1, 2, 5}) {
      if (wanted <= nice * decade * 1.0001) {
        return nice * decade;
      }
    }
    return 10 * decade;
  }
}
