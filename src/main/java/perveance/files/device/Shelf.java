package perveance.files.device;

import java.util.List;
import java.util.Optional;
import perveance.engine.base.BadInputException;
import perveance.files.toml.SourceText;

/** A place where device files lie. */
interface Shelf {
  /** Ends of the names of device files. */
  String SUFFIX = ".toml";

  /** The names of the device files, in order. */
  List<String> files() throws BadInputException;

  /** The text of a file; empty when there is none of that name. */
  Optional<SourceText> read(String file) throws BadInputException;

  /** The first bytes of a file that is there, as text that may break off. */
  SourceText readHead(String file, int bytes) throws BadInputException;
}
