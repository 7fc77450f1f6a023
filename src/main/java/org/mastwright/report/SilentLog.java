package org.mastwright.report;

import com.openhtmltopdf.util.Diagnostic;
import com.openhtmltopdf.util.XRLogger;
import java.util.logging.Level;

/** Keeps the PDF engine off the console: its warnings reach {@link PdfPrinter} another way. */
final class SilentLog implements XRLogger {
  static final SilentLog INSTANCE = new SilentLog();

  private SilentLog() {}

  @Override
  public boolean isLogLevelEnabled(Diagnostic diagnostic) {
    return false;
  }

  @Override
  public void log(String where, Level level, String msg) {}

  @Override
  public void log(String where, Level level, String msg, Throwable th) {}

  @Override
  public void setLevel(String logger, Level level) {}
}
