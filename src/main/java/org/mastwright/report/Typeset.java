package org.mastwright.report;

import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.regex.Pattern;
import org.mastwright.units.UnitSystem;
import org.mastwright.working.Step;

/**
 * Formulas as XHTML: symbols in italics with subscripts, fractions upright where they have room.
 */
final class Typeset {
  /** A fraction with a longer side than this is set on one line with a slash. */
  private static final int LONGEST_FRACTION = 62;

  /** A value that needs brackets before it is raised to a power; a negative one has them. */
  private static final Pattern VALUE_WITH_UNIT =
      Pattern.compile("<span class=\"v\">[^( ]+ [^<]*</span>");

  private Typeset() {}

  /** {@code F_Rd} as a symbol. */
  static String symbol(String symbol) {
    int at = symbol.indexOf('_');
    if (at <= 0) {
      return letters(symbol);
    }
    String lower = symbol.substring(at + 1).replace("_", ",");
    return letters(symbol.substring(0, at)) + "<sub>" + Svg.escape(lower) + "</sub>";
  }

  /** One or two letters are a symbol; longer names are words and stand upright. */
  private static String letters(String text) {
    String escaped = Svg.escape(text);
    return text.codePointCount(0, text.length()) <= 3 ? "<i>" + escaped + "</i>" : escaped;
  }

  /** The formula in symbols; words of a given value as they are. */
  static String formula(Step step) {
    return step.isCalculated()
        ? set(step, Typeset::symbol, String::length, step.formula())
        : Svg.escape(step.template());
  }

  /** The formula with its numbers put in; blank for a given value. */
  static String numbers(Step step, UnitSystem units) {
    if (!step.isCalculated()) {
      return "";
    }
    Function<String, String> value = name -> value(step.inputs(), name, units);
    return set(
        step,
        n -> "<span class=\"v\">" + Svg.escape(value.apply(n)) + "</span>",
        n -> value.apply(n).length(),
        step.substituted(units));
  }

  private static String value(List<Step.Input> inputs, String name, UnitSystem units) {
    return inputs.stream()
        .filter(i -> i.symbol().equals(name))
        .map(i -> Print.symbols(i.print(units)))
        .findFirst()
        .orElse(name);
  }

  private static String set(
      Step step, Function<String, String> leaf, Function<String, Integer> size, String plain) {
    Optional<FormulaText> parsed = FormulaText.parse(step.template());
    return parsed
        .map(f -> new Setter(leaf, size).set(f, true))
        .orElseGet(() -> Svg.escape(Print.symbols(plain)));
  }

  /** Sets a parsed formula with one way of printing its variables. */
  private record Setter(Function<String, String> leaf, Function<String, Integer> size) {
    String set(FormulaText f, boolean mayStack) {
      return switch (f.kind()) {
        case VARIABLE -> leaf.apply(f.text());
        case PLAIN -> f.text().equals("π") ? "<i>π</i>" : Svg.escape(f.text());
        case SUM, PRODUCT -> join(f, mayStack);
        case QUOTIENT -> quotient(f, mayStack);
        case POWER -> power(f);
        case ROOT -> "√<span class=\"root\">" + set(f.parts().get(0), false) + "</span>";
        case BRACKET -> "(" + set(f.parts().get(0), mayStack) + ")";
        case BARS -> "|" + set(f.parts().get(0), mayStack) + "|";
        case CALL -> f.text() + "(" + arguments(f) + ")";
        case NEGATIVE -> "−" + set(f.parts().get(0), mayStack);
      };
    }

    private String join(FormulaText f, boolean mayStack) {
      StringBuilder out = new StringBuilder(set(f.parts().get(0), mayStack));
      for (int i = 1; i < f.parts().size(); i++) {
        String sign = String.valueOf(f.text().charAt(i - 1));
        out.append(sign.equals("·") ? " · " : " " + sign + " ");
        out.append(set(f.parts().get(i), mayStack));
      }
      return out.toString();
    }

    private String quotient(FormulaText f, boolean mayStack) {
      FormulaText over = f.parts().get(0);
      FormulaText under = f.parts().get(1);
      if (mayStack && length(over) <= LONGEST_FRACTION && length(under) <= LONGEST_FRACTION) {
        return "<span class=\"frac\"><span class=\"over\">"
            + set(bare(over), false)
            + "</span><span class=\"under\">"
            + set(bare(under), false)
            + "</span></span>";
      }
      return set(over, false) + "/" + set(under, false);
    }

    private static FormulaText bare(FormulaText f) {
      return f.kind() == FormulaText.Kind.BRACKET ? f.parts().get(0) : f;
    }

    private String power(FormulaText f) {
      String set = set(f.parts().get(0), false);
      String raised = set(f.parts().get(1), false);
      boolean bracket = VALUE_WITH_UNIT.matcher(set).matches();
      String base = bracket ? set.replace("\">", "\">(").replace("</", ")</") : set;
      return base + "<sup>" + raised + "</sup>";
    }

    private String arguments(FormulaText f) {
      return String.join(", ", f.parts().stream().map(p -> set(p, false)).toList());
    }

    private int length(FormulaText f) {
      int own = f.kind() == FormulaText.Kind.VARIABLE ? size.apply(f.text()) : f.text().length();
      return own + f.parts().stream().mapToInt(this::length).sum() + f.parts().size();
    }
  }
}
