package org.mastwright.working;

/**
 * Something the reader must know: a fault of the file, a warning, an assumption, an open point.
 *
 * @param id stable, such as {@code E7} or {@code ice-not-stated}
 * @param severity how much it weighs
 * @param path of the key in the tower file, or blank
 * @param line in the tower file from 1, or 0
 * @param column in the tower file from 1, or 0
 * @param message what is so, one or two sentences
 * @param remedy what would be right; blank where nothing can be done
 */
public record Finding(
    String id,
    Severity severity,
    String path,
    int line,
    int column,
    String message,
    String remedy) {

  /** How much a finding weighs. */
  public enum Severity {
    /** The tower file is wrong; nothing is calculated. */
    ERROR,
    /** Doubtful but possible. */
    WARNING,
    /** Makes the verdict at best incomplete. */
    OPEN_POINT,
    /** A value was taken that the user did not give, or a rule was used outside its range. */
    ASSUMPTION,
    /** Worth knowing. */
    NOTE
  }

  public Finding {
    if (id.isBlank() || message.isBlank()) {
      throw new IllegalArgumentException("a finding has an id and a message");
    }
  }

  /** A finding that belongs to no line of the file. */
  public static Finding of(String id, Severity severity, String message, String remedy) {
    return new Finding(id, severity, "", 0, 0, message, remedy);
  }

  /** A finding that belongs to a key. */
  public static Finding at(
      String id, Severity severity, String path, String message, String remedy) {
    return new Finding(id, severity, path, 0, 0, message, remedy);
  }
}
