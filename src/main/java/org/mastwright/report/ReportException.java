package org.mastwright.report;

/** The report could not be made whole; the message says why. */
public final class ReportException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  ReportException(String message) {
    super(message);
  }

  ReportException(String message, Throwable cause) {
    super(message, cause);
  }
}
