package perveance.desktop;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import perveance.desktop.viewmodel.Asking;

/** Answers the questions of a window as a test has laid down. */
final class Answers implements Asking {
  Optional<Path> open = Optional.empty();
  Optional<Path> write = Optional.empty();
  Optional<Integer> choice = Optional.empty();
  Optional<String> word = Optional.empty();
  Unsaved unsaved = Unsaved.STAY;
  final List<String> told = new ArrayList<>();
  final List<String> asked = new ArrayList<>();

  @Override
  public Optional<Path> fileToOpen() {
    asked.add("open");
    return open;
  }

  @Override
  public Optional<Path> fileToWrite(String what, String proposed, String ending) {
    asked.add(what);
    return write;
  }

  @Override
  public Unsaved unsaved(String title) {
    asked.add("unsaved " + title);
    return unsaved;
  }

  @Override
  public Optional<Integer> choose(String question, List<String> choices) {
    asked.add(question);
    return choice;
  }

  @Override
  public Optional<String> word(String question, String proposed) {
    asked.add(question);
    return word;
  }

  @Override
  public void tell(String what, String why, String remedy) {
    told.add(what + "\n" + why + "\n" + remedy);
  }
}
