package org.mastwright.working;

import java.lang.reflect.Field;
import java.lang.reflect.Modifier;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import org.mastwright.units.Unit;

/**
 * Reads the printed template of a formula and works it out, all in SI: an evaluator that shares
 * nothing with the method the formula is bound to.
 *
 * <p>Numbers (a unit behind one turns it to SI), {@code ½ ¼ π}, variables in braces, {@code + − · /
 * ^}, raised figures, {@code √( ) |x|} and the functions of {@link #call}.
 */
public final class TemplateEvaluator {
  private static final String RAISED = "⁰¹²³⁴⁵⁶⁷⁸⁹";
  private static final List<Unit> UNITS = units();

  private final String text;
  private final Map<String, Double> values;
  private int at;

  private TemplateEvaluator(String text, Map<String, Double> values) {
    this.text = text;
    this.values = values;
  }

  /**
   * The value of a template.
   *
   * @throws IllegalArgumentException when it cannot be read to its end
   */
  public static double evaluate(String template, Map<String, Double> values) {
    TemplateEvaluator e = new TemplateEvaluator(template, values);
    double value = e.sum();
    e.blanks();
    if (e.at < template.length()) {
      throw new IllegalArgumentException("\"" + template + "\" cannot be read from " + e.at);
    }
    return value;
  }

  private static List<Unit> units() {
    List<Unit> all = new ArrayList<>();
    for (Field field : Unit.class.getFields()) {
      try {
        if (Modifier.isStatic(field.getModifiers()) && field.get(null) instanceof Unit u) {
          if (u.offset() == 0 && !u.symbol().isEmpty()) {
            all.add(u);
          }
        }
      } catch (IllegalAccessException e) {
        throw new IllegalStateException(e);
      }
    }
    all.sort(Comparator.comparing((Unit u) -> -u.symbol().length()));
    return all;
  }

  private double sum() {
    double value = product();
    while (true) {
      if (next('+')) {
        value += product();
      } else if (next('−') || next('-')) {
        value -= product();
      } else {
        return value;
      }
    }
  }

  private double product() {
    double value = signed();
    while (true) {
      if (next('·')) {
        value *= signed();
      } else if (next('/')) {
        value /= signed();
      } else {
        return value;
      }
    }
  }

  private double signed() {
    return next('−') || next('-') ? -signed() : power();
  }

  private double power() {
    double value = primary();
    while (true) {
      if (next('^')) {
        value = Math.pow(value, signed());
      } else if (at < text.length() && isRaised(text.charAt(at))) {
        value = Math.pow(value, raised());
      } else {
        return value;
      }
    }
  }

  private static boolean isRaised(char c) {
    return c == '⁻' || RAISED.indexOf(c) >= 0;
  }

  private int raised() {
    int sign = 1;
    int value = 0;
    while (at < text.length() && isRaised(text.charAt(at))) {
      char c = text.charAt(at++);
      if (c == '⁻') {
        sign = -1;
      } else {
        value = 10 * value + RAISED.indexOf(c);
      }
    }
    return sign * value;
  }

  private double primary() {
    blanks();
    if (at >= text.length()) {
      throw new IllegalArgumentException("\"" + text + "\" ends too early");
    }
    char c = text.charAt(at);
    if (Character.isDigit(c)) {
      return number();
    }
    at++;
    return switch (c) {
      case '½' -> 0.5;
      case '¼' -> 0.25;
      case 'π' -> Math.PI;
      case '{' -> variable();
      case '(' -> closed(sum(), ')');
      case '|' -> Math.abs(closed(sum(), '|'));
      case '√' -> Math.sqrt(primary());
      default -> call();
    };
  }

  private double number() {
    int from = at;
    while (at < text.length() && (Character.isDigit(text.charAt(at)) || text.charAt(at) == '.')) {
      at++;
    }
    double value = Double.parseDouble(text.substring(from, at));
    for (Unit u : UNITS) {
      if (text.startsWith(" " + u.symbol(), at) && ends(at + 1 + u.symbol().length())) {
        at += 1 + u.symbol().length();
        return u.toSi(value);
      }
    }
    return value;
  }

  private boolean ends(int place) {
    return place >= text.length() || !Character.isLetter(text.charAt(place));
  }

  private double variable() {
    int end = text.indexOf('}', at);
    String name = text.substring(at, end);
    at = end + 1;
    if (!values.containsKey(name)) {
      throw new IllegalArgumentException("no value for " + name);
    }
    return values.get(name);
  }

  private double call() {
    int from = at - 1;
    while (at < text.length() && Character.isLetter(text.charAt(at))) {
      at++;
    }
    String name = text.substring(from, at);
    if (!next('(')) {
      throw new IllegalArgumentException("\"" + text + "\": what is \"" + name + "\"?");
    }
    List<Double> given = new ArrayList<>();
    do {
      given.add(sum());
    } while (next(','));
    double first = closed(given.get(0), ')');
    return switch (name) {
      case "min" -> given.stream().mapToDouble(Double::doubleValue).min().orElseThrow();
      case "max" -> given.stream().mapToDouble(Double::doubleValue).max().orElseThrow();
      case "cos" -> Math.cos(first);
      case "sin" -> Math.sin(first);
      case "tan" -> Math.tan(first);
      case "acos" -> Math.acos(first);
      case "asin" -> Math.asin(first);
      case "atan" -> Math.atan(first);
      case "exp" -> Math.exp(first);
      case "ln" -> Math.log(first);
      case "lg" -> Math.log10(first);
      case "tanh" -> Math.tanh(first);
      default -> throw new IllegalArgumentException("\"" + text + "\": no function " + name);
    };
  }

  private double closed(double value, char closing) {
    if (!next(closing)) {
      throw new IllegalArgumentException("\"" + text + "\": no " + closing + " at " + at);
    }
    return value;
  }

  private boolean next(char c) {
    blanks();
    if (at < text.length() && text.charAt(at) == c) {
      at++;
      return true;
    }
    return false;
  }

  private void blanks() {
    while (at < text.length() && text.charAt(at) == ' ') {
      at++;
    }
  }
}
