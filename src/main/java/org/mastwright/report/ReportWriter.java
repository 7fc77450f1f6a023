package org.mastwright.report;

import java.nio.file.Path;
import java.util.Optional;
import org.mastwright.assess.Assessment;
import org.mastwright.units.UnitSystem;

/** The check report. */
public final class ReportWriter {
  private ReportWriter() {}

  public static byte[] pdf(Assessment a, UnitSystem units, Optional<Path> templates) {
    return new byte[0];
  }
}
