package org.mastwright.report;

import java.util.List;

/** One thing that was given, as printed. */
public record Fact(String name, String value) {
  /** Facts under a heading. */
  public record Group(String heading, List<Fact> facts) {
    public Group {
      facts = List.copyOf(facts);
    }
  }
}
