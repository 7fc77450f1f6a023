package org.mastwright.working;

/**
 * The analysis of a valid design failed: no equilibrium in still air, a mechanism, no convergence.
 * The message is a sentence an engineer can act on: case, place, iterations, likely cause.
 */
public final class AnalysisException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  public AnalysisException(String message) {
    super(message);
  }

  public AnalysisException(String message, Throwable cause) {
    super(message, cause);
  }
}
