package org.mastwright.report;

/** The report could not be made as it should be: nothing of it may be used. */
public final class ReportException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  public ReportException(String message) {
    super(message);
  }

  public ReportException(String message, Throwable cause) {
    super(message, cause);
  }
}
