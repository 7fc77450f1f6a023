package org.mastwright.report;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A printed template as a tree, for setting it; nothing is evaluated.
 *
 * @param text name of a variable or function, a number, or the signs of a sum or product
 */
record FormulaText(Kind kind, String text, List<FormulaText> parts) {
  /** What a part is. */
  enum Kind {
    VARIABLE,
    PLAIN,
    SUM,
    PRODUCT,
    QUOTIENT,
    POWER,
    ROOT,
    BRACKET,
    BARS,
    CALL,
    NEGATIVE
  }

  FormulaText {
    parts = List.copyOf(parts);
  }

  /** The tree of a template; empty when it is not written in the agreed signs. */
  static Optional<FormulaText> parse(String template) {
    try {
      Parser parser = new Parser(template);
      FormulaText whole = parser.sum();
      return parser.atEnd() ? Optional.of(whole) : Optional.empty();
    } catch (UnreadableException e) {
      return Optional.empty();
    }
  }

  private static final class UnreadableException extends RuntimeException {
    private static final long serialVersionUID = 1L;
  }

  /** Recursive descent over sum, product, power and primary. */
  private static final class Parser {
    private static final String RAISED = "²³⁴";
    private final String source;
    private int at;

    Parser(String source) {
      this.source = source;
    }

    boolean atEnd() {
      skipSpaces();
      return at >= source.length();
    }

    private char peek() {
      skipSpaces();
      return at < source.length() ? source.charAt(at) : 0;
    }

    private void skipSpaces() {
      while (at < source.length() && source.charAt(at) == ' ') {
        at++;
      }
    }

    private void expect(char c) {
      if (peek() != c) {
        throw new UnreadableException();
      }
      at++;
    }

    FormulaText sum() {
      List<FormulaText> parts = new ArrayList<>(List.of(product()));
      StringBuilder signs = new StringBuilder();
      while (peek() == '+' || peek() == '−' || peek() == '-') {
        signs.append(source.charAt(at++) == '+' ? '+' : '−');
        parts.add(product());
      }
      return parts.size() == 1 ? parts.get(0) : node(Kind.SUM, signs.toString(), parts);
    }

    private FormulaText product() {
      FormulaText left = power();
      while (peek() == '·' || peek() == '/') {
        if (source.charAt(at++) == '·') {
          left = times(left, power());
        } else {
          left = node(Kind.QUOTIENT, "", List.of(left, power()));
        }
      }
      return left;
    }

    private static FormulaText times(FormulaText left, FormulaText right) {
      if (left.kind != Kind.PRODUCT) {
        return node(Kind.PRODUCT, "·", List.of(left, right));
      }
      List<FormulaText> parts = new ArrayList<>(left.parts);
      parts.add(right);
      return node(Kind.PRODUCT, left.text + "·", parts);
    }

    private FormulaText power() {
      FormulaText base = primary();
      while (true) {
        char c = peek();
        if (c != 0 && RAISED.indexOf(c) >= 0) {
          at++;
          String exponent = String.valueOf((char) ('2' + RAISED.indexOf(c)));
          base = node(Kind.POWER, "", List.of(base, node(Kind.PLAIN, exponent, List.of())));
        } else if (c == '^') {
          at++;
          FormulaText exponent = primary();
          FormulaText bare = exponent.kind == Kind.BRACKET ? exponent.parts.get(0) : exponent;
          base = node(Kind.POWER, "", List.of(base, bare));
        } else {
          return base;
        }
      }
    }

    private FormulaText primary() {
      char c = peek();
      if (c == '{') {
        return variable();
      }
      if (c == '(') {
        return enclosed(Kind.BRACKET, '(', ')');
      }
      if (c == '|') {
        return enclosed(Kind.BARS, '|', '|');
      }
      if (c == '√') {
        at++;
        FormulaText under = peek() == '(' ? enclosed(Kind.BRACKET, '(', ')') : primary();
        return node(
            Kind.ROOT, "", List.of(under.kind == Kind.BRACKET ? under.parts.get(0) : under));
      }
      if (c == '−' || c == '-') {
        at++;
        return node(Kind.NEGATIVE, "", List.of(power()));
      }
      return Character.isDigit(c) ? number() : word();
    }

    private FormulaText variable() {
      int end = source.indexOf('}', at);
      if (end < 0) {
        throw new UnreadableException();
      }
      String name = source.substring(at + 1, end);
      at = end + 1;
      return node(Kind.VARIABLE, name, List.of());
    }

    private FormulaText enclosed(Kind kind, char open, char shut) {
      expect(open);
      FormulaText inner = sum();
      expect(shut);
      return node(kind, "", List.of(inner));
    }

    private FormulaText number() {
      int from = at;
      while (at < source.length()
          && (Character.isDigit(source.charAt(at)) || source.charAt(at) == '.')) {
        at++;
      }
      return node(Kind.PLAIN, source.substring(from, at), List.of());
    }

    private FormulaText word() {
      int from = at;
      while (at < source.length() && Character.isLetter(source.charAt(at))) {
        at++;
      }
      if (from == at) {
        throw new UnreadableException();
      }
      String word = source.substring(from, at);
      if (peek() != '(') {
        return node(Kind.PLAIN, word, List.of());
      }
      expect('(');
      List<FormulaText> arguments = new ArrayList<>(List.of(sum()));
      while (peek() == ',') {
        at++;
        arguments.add(sum());
      }
      expect(')');
      return node(Kind.CALL, word, arguments);
    }

    private static FormulaText node(Kind kind, String text, List<FormulaText> parts) {
      return new FormulaText(kind, text, parts);
    }
  }
}
