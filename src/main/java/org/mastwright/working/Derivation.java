package org.mastwright.working;

import java.util.List;

/** A heading, a sentence and the steps of a calculation. */
public record Derivation(String heading, String words, List<Step> steps) {
  public Derivation {
    steps = List.copyOf(steps);
  }
}
