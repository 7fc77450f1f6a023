package org.mastwright.working;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.mastwright.units.Unit;
import org.mastwright.units.UnitSystem;

/**
 * One printed formula bound to the one method that evaluates it.
 *
 * <p>The template writes each variable in braces, {@code {f_u}·{A}/{γ_M}}; {@code _} starts a
 * subscript. Operators: {@code + − · / ^ ² ³ ⁴ √( ) min( , ) max( , ) cos( ) sin( ) tan( ) π |x|}.
 * A test reads the printed template with an evaluator of its own and compares with the method.
 */
public final class Formula {
  private static final Pattern BRACES = Pattern.compile("\\{([^{}]+)}");

  /**
   * A variable of the template.
   *
   * @param symbol as in the template, without braces
   * @param unit the metric unit it is printed in
   */
  public record Var(String symbol, Unit unit) {}

  /** The method, SI in and SI out. */
  @FunctionalInterface
  public interface Fn {
    /** The value for the variables in the order declared. */
    double at(double[] si);
  }

  private final String symbol;
  private final Unit unit;
  private final String template;
  private final Clause clause;
  private final List<Var> vars;
  private final Fn fn;

  /**
   * @param symbol of the result, {@code F_Rd}
   * @param unit metric unit the result is printed in
   * @throws IllegalArgumentException when the braces and the declared variables differ
   */
  public Formula(String symbol, Unit unit, String template, Clause clause, List<Var> vars, Fn fn) {
    this.symbol = symbol;
    this.unit = unit;
    this.template = template;
    this.clause = clause;
    this.vars = List.copyOf(vars);
    this.fn = fn;
    Set<String> used = new LinkedHashSet<>();
    Matcher braces = BRACES.matcher(template);
    while (braces.find()) {
      used.add(braces.group(1));
    }
    Set<String> declared = new LinkedHashSet<>();
    vars.forEach(v -> declared.add(v.symbol()));
    if (!used.equals(declared) || declared.size() != vars.size()) {
      throw new IllegalArgumentException(
          symbol + ": template uses " + used + ", declared are " + declared);
    }
  }

  public String symbol() {
    return symbol;
  }

  public Unit unit() {
    return unit;
  }

  public String template() {
    return template;
  }

  public Clause clause() {
    return clause;
  }

  public List<Var> vars() {
    return vars;
  }

  /** The bare method, for tests that compare it with the printed template. */
  public double evaluate(double... si) {
    return fn.at(si);
  }

  /**
   * Runs the method and keeps what is needed to print it.
   *
   * @throws ArithmeticException when the result is not finite: such a number never becomes a check
   */
  public Step at(double... si) {
    if (si.length != vars.size()) {
      throw new IllegalArgumentException(symbol + " takes " + vars.size() + " values");
    }
    double value = fn.at(si);
    List<Step.Input> inputs = new ArrayList<>();
    for (int i = 0; i < si.length; i++) {
      inputs.add(new Step.Input(vars.get(i).symbol(), si[i], vars.get(i).unit()));
    }
    if (!Double.isFinite(value)) {
      throw new ArithmeticException(
          symbol + " = " + template + " is not finite for " + inputs + ", " + clause.cite());
    }
    return new Step(symbol, template, inputs, value, unit, clause);
  }

  /** The template without braces. */
  static String plain(String template) {
    return BRACES.matcher(template).replaceAll(m -> Matcher.quoteReplacement(m.group(1)));
  }

  /** The template with each variable replaced by its value and unit. */
  static String substituted(String template, List<Step.Input> inputs, UnitSystem units) {
    return BRACES
        .matcher(template)
        .replaceAll(
            m ->
                Matcher.quoteReplacement(
                    inputs.stream()
                        .filter(i -> i.symbol().equals(m.group(1)))
                        .map(i -> i.print(units))
                        .findFirst()
                        .orElseThrow()));
  }
}
