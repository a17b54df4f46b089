package perveance.desktop.viewmodel;

import java.nio.file.Path;
import java.util.Optional;
import javafx.beans.property.ReadOnlyObjectProperty;
import javafx.beans.property.ReadOnlyObjectWrapper;
import perveance.engine.stage.Chassis;

/** The open file behind a workbench: open, save, keep for a restart. */
public final class Document {
  private final Workbench bench;
  private final Documents documents;
  private final ReadOnlyObjectWrapper<Documents.Opened> opened;

  /**
   * A document.
   *
   * @param bench where its chassis is edited
   * @param documents where files are kept
   * @param opened what stands on the bench
   */
  public Document(Workbench bench, Documents documents, Documents.Opened opened) {
    this.bench = bench;
    this.documents = documents;
    this.opened = new ReadOnlyObjectWrapper<>(opened);
  }

  /**
   * As opened or saved last.
   *
   * @return property
   */
  public ReadOnlyObjectProperty<Documents.Opened> opened() {
    return opened.getReadOnlyProperty();
  }

  /**
   * The store.
   *
   * @return where files are kept
   */
  public Documents documents() {
    return documents;
  }

  /**
   * File of the document.
   *
   * @return file, empty for one never saved
   */
  public Optional<Path> file() {
    return opened.get().file();
  }

  /**
   * Opens a file in place of this one.
   *
   * @param file the file
   * @throws DocumentException when it cannot be used; this one then stays
   */
  public void open(Path file) throws DocumentException {
    show(documents.open(file));
    documents.used(file);
  }

  /**
   * Shows something in place of this one.
   *
   * @param other as opened
   */
  public void show(Documents.Opened other) {
    opened.set(other);
    bench.replace(other.chassis());
  }

  /**
   * Starts anew.
   *
   * @param chassis first chassis
   */
  public void start(Chassis chassis) {
    show(new Documents.Opened(Optional.empty(), "", false, chassis));
  }

  /**
   * Saves to its own file.
   *
   * @return false when it has none yet, so that a person has to name one
   * @throws DocumentException when it cannot be written
   */
  public boolean save() throws DocumentException {
    Optional<Path> file = file();
    if (file.isEmpty()) {
      return false;
    }
    saveAs(file.get());
    return true;
  }

  /**
   * Saves to a file.
   *
   * @param file where to
   * @throws DocumentException when it cannot be written; an older file is then still there
   */
  public void saveAs(Path file) throws DocumentException {
    opened.set(documents.save(opened.get(), bench.chassis(), file));
    bench.saved(file);
    documents.used(file);
    documents.forget();
  }

  /**
   * Keeps what is not saved, or forgets it when all is saved.
   *
   * @throws DocumentException when it cannot be kept
   */
  public void keep() throws DocumentException {
    if (bench.chassis().equals(bench.savedChassis())) {
      documents.forget();
    } else {
      documents.keep(opened.get(), bench.chassis());
    }
  }

  /**
   * Takes up what an ended program left.
   *
   * @param left what was left
   * @throws DocumentException when it cannot be used
   */
  public void restore(Documents.Left left) throws DocumentException {
    Documents.Opened restored = documents.read("the recovered chassis", left.text());
    Documents.Opened base = left.original().flatMap(this::original).orElse(restored);
    show(base);
    if (base.file().isPresent()) {
      bench.restore(restored.chassis());
    } else {
      bench.unsaved();
    }
    documents.forget(left);
  }

  /** The file as it is on the disk; empty when it is gone or cannot be read. */
  private Optional<Documents.Opened> original(Path file) {
    try {
      return Optional.of(documents.open(file));
    } catch (DocumentException e) {
      return Optional.empty();
    }
  }
}
