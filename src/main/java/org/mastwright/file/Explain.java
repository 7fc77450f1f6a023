package org.mastwright.file;

import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.mastwright.units.Dimension;
import org.mastwright.units.Quantities;

/** What a key of the tower file means, in the words of the catalogue. */
public final class Explain {
  private Explain() {}

  /** All that is known of the keys a word names, as lines; empty when none is. */
  public static List<String> key(String word) {
    List<String> out = new ArrayList<>();
    for (KeyCatalogue.Entry e : KeyCatalogue.named(word)) {
      if (!out.isEmpty()) {
        out.add("");
      }
      out.add(e.path() + "   " + form(e));
      out.add("  " + e.says());
      if (!e.measure().isEmpty()) {
        out.add("  How to find it: " + e.measure());
      }
      out.add("  Left out: " + leftOut(e));
      if (e.use() != KeyCatalogue.Use.USED) {
        out.add(
            "  Read, not yet used"
                + (e.use() == KeyCatalogue.Use.OPEN
                    ? ": the verdict is then at best incomplete."
                    : "."));
      }
      if (!e.keys().isEmpty()) {
        out.add("  Keys: " + String.join(", ", e.keys().keySet()));
      }
    }
    return out;
  }

  private static String leftOut(KeyCatalogue.Entry e) {
    if (e.must()) {
      return "the file is refused; it is never guessed.";
    }
    return e.otherwise().isEmpty() ? "nothing is taken." : e.otherwise() + " is taken.";
  }

  /** {@code speed, such as mph or m/s; or keys}. */
  private static String form(KeyCatalogue.Entry e) {
    List<String> forms = new ArrayList<>();
    for (String kind : e.kinds()) {
      forms.add(
          switch (kind) {
            case "choice" -> String.join(" | ", e.choices());
            case "whole" -> "whole number";
            case "one" -> "number or %";
            case "share" -> "% of breaking";
            case "yes-no" -> "yes | no";
            case "text", "date" -> kind;
            case "bearing" -> "bearing (deg, or N, NE, ...)";
            default -> kind.replace('-', ' ') + " (" + units(kind) + ")";
          });
    }
    if (!e.keys().isEmpty()) {
      forms.add("{keys}");
    }
    String one = String.join(", or ", forms);
    return e.many() == KeyCatalogue.Many.ONE ? one : one + "; one or several in [ ]";
  }

  private static String units(String kind) {
    Dimension d = Dimension.valueOf(kind.toUpperCase(Locale.ROOT).replace('-', '_'));
    return Quantities.accepted(d);
  }

  /** One sentence or two for an editor's tooltip. */
  static String inOneLine(KeyCatalogue.Entry e) {
    StringBuilder words = new StringBuilder(e.says());
    if (!e.measure().isEmpty()) {
      words.append(" How to find it: ").append(e.measure());
    }
    if (!e.otherwise().isEmpty()) {
      words.append(" Left out: ").append(e.otherwise()).append(" is taken.");
    }
    if (e.use() != KeyCatalogue.Use.USED) {
      words.append(" Read, not yet used.");
    }
    return words.toString();
  }
}
