package org.mastwright.design;

import java.util.Map;
import java.util.OptionalDouble;

/**
 * A joint along the mast.
 *
 * @param along_m from the mast foot
 * @param detailCategory_Pa fatigue category stated by the user
 * @param preload_N of one bolt, as stated
 * @param lengths further dimensions by key in metres, such as {@code plate}, {@code overlap}
 * @param words further words by key, such as {@code grade}, {@code shape}
 */
public record Joint(
    double along_m,
    Kind kind,
    OptionalDouble detailCategory_Pa,
    OptionalDouble preload_N,
    Map<String, Double> lengths,
    Map<String, String> words,
    int bolts) {
  public Joint {
    lengths = Map.copyOf(lengths);
    words = Map.copyOf(words);
  }

  /** The kinds of joint. */
  public enum Kind {
    FLANGE,
    SLIP,
    SLEEVE,
    COUPLING,
    THREADED,
    WELDED,
    WELDED_STEP,
    BASE_PLATE,
    HEAD_FLANGE,
    PINNED;

    /** As typed. */
    public String key() {
      return name().toLowerCase(java.util.Locale.ROOT).replace('_', '-');
    }
  }
}
