package perveance.app;

import java.util.ArrayList;
import java.util.List;
import perveance.engine.stage.Chassis;
import perveance.engine.stage.Conditions;
import perveance.engine.stage.Setting;
import perveance.engine.stage.StageEntry;
import perveance.engine.stage.Supply;

/** One change of a chassis; applying it makes a new chassis. */
public sealed interface Edit {
  /**
   * What undo and redo call it.
   *
   * @return for example {@code set V1a anode load to 220k}
   */
  String label();

  /**
   * The changed chassis.
   *
   * @param chassis before
   * @return after
   * @throws IllegalArgumentException when it does not fit this chassis, for example an unknown
   *     stage
   */
  Chassis apply(Chassis chassis);

  /**
   * Sets a key of a stage.
   *
   * @param ref stage
   * @param key key
   * @param setting new value
   */
  record SetKey(String ref, String key, Setting setting) implements Edit {
    @Override
    public String label() {
      return "set " + ref + " " + key.replace('_', ' ') + " to " + setting.text();
    }

    @Override
    public Chassis apply(Chassis chassis) {
      return StageEdits.replace(chassis, ref, s -> s.with(key, setting));
    }
  }

  /**
   * Takes a key out of a stage.
   *
   * @param ref stage
   * @param key key
   */
  record ClearKey(String ref, String key) implements Edit {
    @Override
    public String label() {
      return "remove " + ref + " " + key.replace('_', ' ');
    }

    @Override
    public Chassis apply(Chassis chassis) {
      return StageEdits.replace(chassis, ref, s -> s.without(key));
    }
  }

  /**
   * Adds a stage.
   *
   * @param stage new stage
   * @param index position, 0 is first
   */
  record AddStage(StageEntry stage, int index) implements Edit {
    @Override
    public String label() {
      return "add " + stage.ref();
    }

    @Override
    public Chassis apply(Chassis chassis) {
      if (chassis.stage(stage.ref()).isPresent()) {
        throw new IllegalArgumentException("there is a stage named " + stage.ref() + " already");
      }
      List<StageEntry> stages = new ArrayList<>(chassis.stages());
      stages.add(Math.max(0, Math.min(index, stages.size())), stage);
      return StageEdits.withStages(chassis, stages);
    }
  }

  /**
   * Removes a stage; what drove it drives nothing.
   *
   * @param ref stage
   */
  record RemoveStage(String ref) implements Edit {
    @Override
    public String label() {
      return "remove " + ref;
    }

    @Override
    public Chassis apply(Chassis chassis) {
      return StageEdits.remove(chassis, ref);
    }
  }

  /**
   * Moves a stage in the list.
   *
   * @param ref stage
   * @param index new position, 0 is first
   */
  record MoveStage(String ref, int index) implements Edit {
    @Override
    public String label() {
      return "move " + ref;
    }

    @Override
    public Chassis apply(Chassis chassis) {
      return StageEdits.move(chassis, ref, index);
    }
  }

  /**
   * Renames a stage everywhere.
   *
   * @param ref old name
   * @param name new name
   */
  record RenameStage(String ref, String name) implements Edit {
    @Override
    public String label() {
      return "rename " + ref + " to " + name;
    }

    @Override
    public Chassis apply(Chassis chassis) {
      return StageEdits.rename(chassis, ref, name);
    }
  }

  /**
   * Changes a supply node, or adds it when it is new.
   *
   * @param supply the node
   */
  record SetSupply(Supply supply) implements Edit {
    @Override
    public String label() {
      return "set supply " + supply.name();
    }

    @Override
    public Chassis apply(Chassis chassis) {
      return SupplyEdits.set(chassis, supply);
    }
  }

  /**
   * Renames a supply node everywhere.
   *
   * @param name old name
   * @param changed new name
   */
  record RenameSupply(String name, String changed) implements Edit {
    @Override
    public String label() {
      return "rename supply " + name + " to " + changed;
    }

    @Override
    public Chassis apply(Chassis chassis) {
      return SupplyEdits.rename(chassis, name, changed);
    }
  }

  /**
   * Removes a supply node that nothing uses.
   *
   * @param name node
   */
  record RemoveSupply(String name) implements Edit {
    @Override
    public String label() {
      return "remove supply " + name;
    }

    @Override
    public Chassis apply(Chassis chassis) {
      return SupplyEdits.remove(chassis, name);
    }
  }

  /**
   * Changes the title.
   *
   * @param title new title
   */
  record SetTitle(String title) implements Edit {
    @Override
    public String label() {
      return "change the title";
    }

    @Override
    public Chassis apply(Chassis chassis) {
      return new Chassis(title, chassis.conditions(), chassis.supplies(), chassis.stages());
    }
  }

  /**
   * Changes mains, meter, tolerances.
   *
   * @param conditions new conditions
   */
  record SetConditions(Conditions conditions) implements Edit {
    @Override
    public String label() {
      return "change the conditions";
    }

    @Override
    public Chassis apply(Chassis chassis) {
      return new Chassis(chassis.title(), conditions, chassis.supplies(), chassis.stages());
    }
  }

  /**
   * Several edits that are undone together, for example a remedy.
   *
   * @param label what they are together
   * @param edits in order
   */
  record Together(String label, List<Edit> edits) implements Edit {
    /** Copies the list. */
    public Together {
      edits = List.copyOf(edits);
    }

    @Override
    public Chassis apply(Chassis chassis) {
      Chassis changed = chassis;
      for (Edit edit : edits) {
        changed = edit.apply(changed);
      }
      return changed;
    }
  }
}
