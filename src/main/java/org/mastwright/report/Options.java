package org.mastwright.report;

import java.nio.file.Path;
import java.util.Optional;

/**
 * How the report is made.
 *
 * @param templates a folder whose files stand in for the built-in templates of the same name
 */
public record Options(Optional<Path> templates) {
  /** The built-in templates. */
  public static final Options BUILT_IN = new Options(Optional.empty());
}
