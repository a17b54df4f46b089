package perveance.reference;

import java.io.File;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;

/** Runs netlists in the simulator and reads the columns that it writes. */
final class Simulator {
  private static final long SECONDS = 60;

  private final Path folder;

  Simulator(Path folder) {
    this.folder = folder;
  }

  /**
   * Runs an analysis and gives its table, the first column being the sweep or the time.
   *
   * @param netlist circuit
   * @param analysis for example {@code op}
   * @param vectors what to write
   */
  List<double[]> run(List<String> netlist, String analysis, List<String> vectors) {
    List<String> deck = new ArrayList<>(netlist);
    deck.add(".control");
    deck.add("set numdgt=15");
    deck.add("set wr_singlescale");
    deck.add(analysis);
    deck.add("wrdata table.txt " + String.join(" ", vectors));
    deck.add("quit");
    deck.add(".endc");
    deck.add(".end");
    try {
      Files.deleteIfExists(folder.resolve("table.txt"));
      Files.write(folder.resolve("deck.cir"), deck, StandardCharsets.US_ASCII);
      File log = folder.resolve("log.txt").toFile();
      Process process =
          new ProcessBuilder("ngspice", "-b", "-n", "deck.cir")
              .directory(folder.toFile())
              .redirectErrorStream(true)
              .redirectOutput(log)
              .start();
      if (!process.waitFor(SECONDS, TimeUnit.SECONDS)) {
        process.destroyForcibly();
        throw new IllegalStateException("the simulator did not end: " + analysis);
      }
      return table(analysis);
    } catch (IOException e) {
      throw new java.io.UncheckedIOException(e);
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw new IllegalStateException(e);
    }
  }

  private List<double[]> table(String analysis) throws IOException {
    Path file = folder.resolve("table.txt");
    if (!Files.exists(file)) {
      String log = Files.readString(folder.resolve("log.txt"), StandardCharsets.US_ASCII);
      throw new IllegalStateException("no answer to " + analysis + ":\n" + log);
    }
    List<double[]> rows = new ArrayList<>();
    for (String line : Files.readAllLines(file, StandardCharsets.US_ASCII)) {
      String[] words = line.trim().split("\\s+");
      double[] row = new double[words.length];
      for (int i = 0; i < row.length; i++) {
        row[i] = Double.parseDouble(words[i]);
      }
      rows.add(row);
    }
    return rows;
  }
}
