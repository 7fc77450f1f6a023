package org.mastwright.loads;

import java.util.List;
import org.mastwright.forces.LimitState;
import org.mastwright.working.Clause;
import org.mastwright.working.Step;

/** A combination of actions of one basis, that makes a load case for each direction and variant. */
public interface Combination {
  /** Code such as {@code I1}. */
  String code();

  /** In words. */
  String title();

  /** Why it exists, one sentence for the report. */
  String purpose();

  /** What it is made of with its factors: {@code 1.35 G + P lo/hi + 3.0 W}. */
  String composition();

  LimitState limitState();

  /** The clause that asks for it. */
  Clause clause();

  /** Each factor used with its source. */
  List<Factor> factors();

  /** The derivation of its loads, for the report; for the reference direction. */
  List<Step> derivation();

  /** Its variants: pretension, state of the rotor, signs. At least one. */
  List<Variant> variants();

  /** False when the direction makes no difference: one case is then enough. */
  boolean directional();

  /** The case for wind from {@code windFrom_rad}. */
  LoadCase at(double windFrom_rad, Variant variant);

  /** A partial factor with its source. */
  record Factor(String name, double valueFactor, Clause clause) {}

  /**
   * One variant.
   *
   * @param key short, for case ids: {@code lo-spin}
   * @param words for the title: {@code spinning, loose guys}
   */
  record Variant(String key, String words, PretensionState pretension) {}
}
