package org.mastwright.design;

import java.util.List;
import java.util.Map;

/**
 * By which standards the tower is judged.
 *
 * @param also further load bases, reported side by side and never mixed
 * @param reliabilityClass 1 to 3 (EN)
 * @param robust whether the loss of a guy or an anchor counts in the verdict
 * @param nation national values by key, such as {@code gamma-m1}
 */
public record Basis(
    LoadBasis loads,
    StrengthBasis strength,
    List<LoadBasis> also,
    int reliabilityClass,
    double serviceLife_s,
    boolean robust,
    Map<String, Double> nation) {
  public Basis {
    also = List.copyOf(also);
    nation = Map.copyOf(nation);
  }

  /** Where the actions and their factors come from. */
  public enum LoadBasis {
    IEC_61400_2("iec-61400-2", "IEC 61400-2 simplified"),
    EN_1991_1_4("en-1991-1-4", "EN 1991-1-4"),
    ASCE_7_16("asce-7-16", "ASCE 7-16"),
    ASCE_7_22("asce-7-22", "ASCE 7-22");

    private final String key;
    private final String title;

    LoadBasis(String key, String title) {
      this.key = key;
      this.title = title;
    }

    /** As typed in the tower file. */
    public String key() {
      return key;
    }

    /** As printed. */
    public String title() {
      return title;
    }
  }

  /** Where the resistances come from. */
  public enum StrengthBasis {
    EN_1993("en-1993", "EN 1993"),
    AISC_360_16("aisc-360-16", "AISC 360-16 LRFD"),
    AISC_360_22("aisc-360-22", "AISC 360-22 LRFD");

    private final String key;
    private final String title;

    StrengthBasis(String key, String title) {
      this.key = key;
      this.title = title;
    }

    /** As typed in the tower file. */
    public String key() {
      return key;
    }

    /** As printed. */
    public String title() {
      return title;
    }
  }
}
