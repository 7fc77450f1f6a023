package org.mastwright.cli;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.util.Optional;
import org.mastwright.assess.Assessment;
import org.mastwright.report.Options;
import org.mastwright.report.ReportWriter;

/** A report in memory, so that it is written whole or not at all. */
final class Pdf {
  private Pdf() {}

  static byte[] of(Assessment a, OutputOptions output) throws IOException {
    ByteArrayOutputStream report = new ByteArrayOutputStream();
    ReportWriter.write(a, report, new Options(Optional.ofNullable(output.templates)));
    return report.toByteArray();
  }
}
