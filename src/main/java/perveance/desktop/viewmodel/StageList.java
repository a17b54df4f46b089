package perveance.desktop.viewmodel;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Predicate;
import perveance.app.Edit;
import perveance.engine.base.QuantityException;
import perveance.engine.base.QuantityParser;
import perveance.engine.base.Unit;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.StageKind;
import perveance.engine.stage.Supply;
import perveance.engine.stage.SupplyFeed;
import perveance.engine.stage.SupplyRatings;

/** What can be done with the stages and supply nodes of a chassis. */
public final class StageList {
  private final Workbench bench;

  /**
   * The list of a workbench.
   *
   * @param bench the workbench
   */
  public StageList(Workbench bench) {
    this.bench = bench;
  }

  /**
   * Adds a stage with usual values behind the chosen one and chooses it.
   *
   * @param kind kind of the stage
   * @param device its valve, empty for a usual one
   * @return why it could not be added, empty when it was
   */
  public Optional<String> add(StageKind kind, Optional<String> device) {
    Chassis chassis = bench.chassis();
    String ref = free("V", 1, "", name -> taken(chassis, name));
    Optional<StageEntry> entry = new StageStarter(bench.engine()).start(chassis, ref, kind, device);
    if (entry.isEmpty()) {
      return Optional.of("No usual values are known for a " + kind.title() + ".");
    }
    Optional<String> refused = bench.edit(new Edit.AddStage(entry.get(), place() + 1));
    if (refused.isEmpty()) {
      bench.chosenStage().set(ref);
    }
    return refused;
  }

  private int place() {
    return index(bench.chosenStage().get());
  }

  private int index(String ref) {
    List<String> refs = bench.chassis().stages().stream().map(StageEntry::ref).toList();
    return refs.indexOf(ref);
  }

  /** Whether a name is a stage's or that of one of its valves. */
  private static boolean taken(Chassis chassis, String name) {
    return chassis.stages().stream()
        .anyMatch(
            s ->
                s.ref().startsWith(name)
                    || s.settings().values().stream().anyMatch(v -> v.text().equals(name)));
  }

  private static String free(String head, int first, String tail, Predicate<String> taken) {
    int number = first;
    while (taken.test(head + number + tail)) {
      number++;
    }
    return head + number + tail;
  }

  /**
   * Adds a copy of a stage behind it.
   *
   * @param ref the stage
   * @return why it could not be, empty when it was
   */
  public Optional<String> duplicate(String ref) {
    Chassis chassis = bench.chassis();
    Optional<StageEntry> stage = chassis.stage(ref);
    if (stage.isEmpty()) {
      return Optional.of("There is no stage " + ref + ".");
    }
    String name = free("V", 1, "", n -> taken(chassis, n));
    StageEntry copy =
        new StageEntry(name, stage.get().kind(), stage.get().settings())
            .without("drives")
            .without("ref2");
    if (stage.get().settings().containsKey("ref2")) {
      copy = copy.with("ref2", new perveance.engine.stage.Setting.Word(name + "b"));
    }
    Optional<String> refused = bench.edit(new Edit.AddStage(copy, index(ref) + 1));
    if (refused.isEmpty()) {
      bench.chosenStage().set(name);
    }
    return refused;
  }

  /**
   * Moves a stage in the list.
   *
   * @param ref the stage
   * @param by places, negative upwards
   */
  public void move(String ref, int by) {
    bench.edit(new Edit.MoveStage(ref, index(ref) + by));
  }

  /**
   * Renames a stage.
   *
   * @param ref old name
   * @param name new name
   */
  public void rename(String ref, String name) {
    boolean chosen = bench.chosenStage().get().equals(ref);
    if (bench.edit(new Edit.RenameStage(ref, name.strip())).isEmpty() && chosen) {
      bench.chosenStage().set(name.strip());
    }
  }

  /**
   * Removes a stage.
   *
   * @param ref the stage
   */
  public void remove(String ref) {
    bench.edit(new Edit.RemoveStage(ref));
  }

  /**
   * Renames a supply node.
   *
   * @param name old name
   * @param changed new name
   */
  public void renameSupply(String name, String changed) {
    bench.edit(new Edit.RenameSupply(name, changed.strip()));
  }

  /**
   * Removes a supply node that nothing uses.
   *
   * @param name the node
   */
  public void removeSupply(String name) {
    bench.edit(new Edit.RemoveSupply(name));
  }

  /**
   * A name that no supply node has.
   *
   * @return a letter, or a letter with a number
   */
  public String freeSupplyName() {
    for (char letter = 'A'; letter <= 'Z'; letter++) {
      if (bench.chassis().supply(String.valueOf(letter)).isEmpty()) {
        return String.valueOf(letter);
      }
    }
    return free("S", 1, "", n -> bench.chassis().supply(n).isPresent());
  }

  /**
   * Sets a supply node from what was typed.
   *
   * @param name name of the node
   * @param from node that feeds it through a dropper, empty for a stated voltage
   * @param value voltage, or resistance of the dropper
   * @param reservoir capacitance, nothing for none
   * @param bleeder resistance, nothing for none
   * @return why it cannot be, empty when it was done
   */
  public Optional<String> setSupply(
      String name, Optional<String> from, String value, String reservoir, String bleeder) {
    try {
      SupplyFeed feed =
          from.isPresent()
              ? new SupplyFeed.Dropped(from.get(), positive(value, Unit.OHM))
              : new SupplyFeed.Stated(QuantityParser.parse(value, Unit.VOLT).value());
      Supply supply =
          new Supply(name, feed, optional(reservoir, Unit.FARAD), optional(bleeder, Unit.OHM));
      SupplyRatings ratings =
          bench.chassis().supply(name).map(Supply::ratings).orElse(SupplyRatings.NONE);
      return bench.edit(new Edit.SetSupply(supply.with(ratings)));
    } catch (QuantityException e) {
      return Optional.of("Found " + e.found() + ", expected " + e.expected() + ".");
    }
  }

  private static OptionalDouble optional(String text, Unit unit) throws QuantityException {
    return text.isBlank() ? OptionalDouble.empty() : OptionalDouble.of(positive(text, unit));
  }

  private static double positive(String text, Unit unit) throws QuantityException {
    double value = QuantityParser.parse(text, unit).value();
    if (!(value > 0)) {
      throw new QuantityException(text, unit.quantityWord() + " above zero");
    }
    return value;
  }
}
