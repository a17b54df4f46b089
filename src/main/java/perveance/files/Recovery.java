package perveance.files;

import java.nio.file.Path;
import java.time.Instant;
import java.util.Optional;

/**
 * What was left of a document whose program ended without saving it.
 *
 * @param file the recovery file
 * @param original the file that was being edited; empty for one never saved
 * @param text the chassis file as last edited
 * @param time when it was kept last
 */
public record Recovery(Path file, Optional<Path> original, String text, Instant time) {}
