package perveance.app;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.engine.stage.Chassis;

/**
 * A chassis with everything that can be undone and redone; immutable, without limit.
 *
 * @param past steps that can be undone, oldest first
 * @param now the chassis as it is
 * @param future steps that can be redone, next one last
 */
public record History(List<Step> past, Chassis now, List<Step> future) {
  /** Copies the lists. */
  public History {
    past = List.copyOf(past);
    future = List.copyOf(future);
  }

  /**
   * A chassis on the other side of an edit.
   *
   * @param label what the edit is called
   * @param chassis the chassis before it (in the past) or after it (in the future)
   */
  public record Step(String label, Chassis chassis) {}

  /**
   * A history without steps.
   *
   * @param chassis where it starts
   * @return the history
   */
  public static History of(Chassis chassis) {
    return new History(List.of(), chassis, List.of());
  }

  /**
   * Does an edit; what was undone before can no longer be redone.
   *
   * @param edit the edit
   * @return the history after it; this one when the edit changes nothing
   * @throws IllegalArgumentException when the edit does not fit
   */
  public History after(Edit edit) {
    Chassis changed = edit.apply(now);
    return changed.equals(now)
        ? this
        : new History(plus(past, new Step(edit.label(), now)), changed, List.of());
  }

  /**
   * Does an edit that continues the last one, for example while a hand drags: both are undone
   * together.
   *
   * @param edit the edit
   * @return the history after it
   */
  public History continued(Edit edit) {
    if (past.isEmpty()) {
      return after(edit);
    }
    Step first = past.get(past.size() - 1);
    List<Step> steps = new ArrayList<>(past.subList(0, past.size() - 1));
    steps.add(new Step(edit.label(), first.chassis()));
    return new History(steps, edit.apply(now), List.of());
  }

  /**
   * Undoes the last edit.
   *
   * @return the history before it; this one when there is nothing to undo
   */
  public History undone() {
    if (past.isEmpty()) {
      return this;
    }
    Step step = past.get(past.size() - 1);
    return new History(
        past.subList(0, past.size() - 1),
        step.chassis(),
        plus(future, new Step(step.label(), now)));
  }

  /**
   * Does the last undone edit again.
   *
   * @return the history after it; this one when there is nothing to redo
   */
  public History redone() {
    if (future.isEmpty()) {
      return this;
    }
    Step step = future.get(future.size() - 1);
    return new History(
        plus(past, new Step(step.label(), now)),
        step.chassis(),
        future.subList(0, future.size() - 1));
  }

  /**
   * What undo would undo.
   *
   * @return label, empty when nothing
   */
  public Optional<String> undoLabel() {
    return past.isEmpty() ? Optional.empty() : Optional.of(past.get(past.size() - 1).label());
  }

  /**
   * What redo would do again.
   *
   * @return label, empty when nothing
   */
  public Optional<String> redoLabel() {
    return future.isEmpty() ? Optional.empty() : Optional.of(future.get(future.size() - 1).label());
  }

  private static List<Step> plus(List<Step> steps, Step step) {
    List<Step> more = new ArrayList<>(steps);
    more.add(step);
    return more;
  }
}
