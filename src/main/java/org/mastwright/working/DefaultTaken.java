package org.mastwright.working;

/**
 * A value the user did not give.
 *
 * @param path of the key
 * @param value what was taken, as text with its unit
 * @param source of the default
 * @param side on which it lies
 */
public record DefaultTaken(String path, String value, String source, Side side) {
  /** On which side a default lies. */
  public enum Side {
    /** Errs towards more load or less resistance. */
    SAFE("safe"),
    /** Makes no difference that matters. */
    NEUTRAL("neutral"),
    /** Could be either. */
    UNKNOWN("unknown");

    private final String word;

    Side(String word) {
      this.word = word;
    }

    /** The word of results.json. */
    public String word() {
      return word;
    }
  }
}
