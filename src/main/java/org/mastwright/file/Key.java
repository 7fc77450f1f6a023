package org.mastwright.file;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.BiConsumer;
import org.mastwright.units.Dimension;
import org.mastwright.units.Quantities;
import org.mastwright.units.Unit;
import org.snakeyaml.engine.v2.nodes.MappingNode;
import org.snakeyaml.engine.v2.nodes.Node;
import org.snakeyaml.engine.v2.nodes.NodeTuple;
import org.snakeyaml.engine.v2.nodes.ScalarNode;
import org.snakeyaml.engine.v2.nodes.SequenceNode;

/**
 * A place in the tower file: a node with its path, asked for what it holds. Faults are collected.
 */
final class Key {
  private final String path;
  private final Node node;
  private final Faults faults;
  private final Set<String> asked = new LinkedHashSet<>();

  Key(String path, Node node, Faults faults) {
    this.path = path;
    this.node = node;
    this.faults = faults;
  }

  String path() {
    return path;
  }

  int line() {
    return node.getStartMark().map(m -> m.getLine() + 1).orElse(0);
  }

  int column() {
    return node.getStartMark().map(m -> m.getColumn() + 1).orElse(0);
  }

  Faults faults() {
    return faults;
  }

  void error(String id, String message, String remedy) {
    faults.error(id, this, message, remedy);
  }

  boolean isMap() {
    return node instanceof MappingNode;
  }

  boolean isList() {
    return node instanceof SequenceNode;
  }

  boolean isScalar() {
    return node instanceof ScalarNode;
  }

  private String join(String key) {
    return path.isEmpty() ? key : path + "." + key;
  }

  /** A key of this mapping, if it is there; it must stand in the catalogue. */
  Optional<Key> get(String key) {
    assert KeyCatalogue.at(join(key)).isPresent() : join(key) + " is not in the catalogue of keys";
    asked.add(key);
    if (node instanceof MappingNode map) {
      for (NodeTuple t : map.getValue()) {
        if (t.getKeyNode() instanceof ScalarNode k && k.getValue().equals(key)) {
          return Optional.of(new Key(join(key), t.getValueNode(), faults));
        }
      }
    }
    return Optional.empty();
  }

  /** The same, with an error when it is missing. */
  Optional<Key> need(String key, String id, String what) {
    Optional<Key> found = get(key);
    if (found.isEmpty()) {
      faults.error(id, this, what, "Add `" + key + ":`.");
    }
    return found;
  }

  boolean has(String key) {
    return get(key).isPresent();
  }

  /** The elements of a list, or the value itself as a list of one. */
  List<Key> items() {
    List<Key> all = new ArrayList<>();
    if (node instanceof SequenceNode list) {
      int i = 1;
      for (Node n : list.getValue()) {
        all.add(new Key(path + "[" + i++ + "]", n, faults));
      }
    } else {
      all.add(this);
    }
    return all;
  }

  /**
   * Call when all that is wanted was asked for: says which keys are not known here, and which are
   * known and not used.
   */
  void close() {
    Map<String, KeyCatalogue.Entry> known =
        KeyCatalogue.at(path).map(KeyCatalogue.Entry::keys).orElse(Map.of());
    if (node instanceof MappingNode map) {
      for (NodeTuple t : map.getValue()) {
        if (t.getKeyNode() instanceof ScalarNode k) {
          String name = k.getValue();
          KeyCatalogue.Entry entry = known.get(name);
          if (entry == null) {
            unknown(new Key(join(name), k, faults), name, known.keySet());
          } else if (entry.use() == KeyCatalogue.Use.OPEN) {
            faults.open(
                "read-not-used",
                join(name),
                entry.says() + " Read, not yet used.",
                "Have " + join(name) + " checked separately: nothing is calculated from it.");
          } else if (entry.use() == KeyCatalogue.Use.NOTED || !asked.contains(name)) {
            faults.note("read-not-used", join(name), entry.says() + " Read, not yet used.");
          }
        }
      }
    } else if (!(node instanceof ScalarNode s && s.getValue().isEmpty())) {
      error("shape", "keys are expected here, such as " + String.join(", ", known.keySet()), "");
    }
  }

  private static void unknown(Key at, String name, Set<String> known) {
    String near = nearest(name, known);
    at.error(
        "E5",
        "is not a known key.",
        near.isEmpty()
            ? "Known here: " + String.join(", ", known) + "."
            : "Did you mean `" + near + "`?");
  }

  private static String nearest(String word, Set<String> known) {
    String best = "";
    int least = 1 + word.length() / 2;
    for (String other : known) {
      int d = distance(word, other);
      if (d < least) {
        least = d;
        best = other;
      }
    }
    return best;
  }

  private static int distance(String a, String b) {
    int[] row = new int[b.length() + 1];
    for (int j = 0; j <= b.length(); j++) {
      row[j] = j;
    }
    for (int i = 1; i <= a.length(); i++) {
      int corner = row[0];
      row[0] = i;
      for (int j = 1; j <= b.length(); j++) {
        int change = corner + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
        corner = row[j];
        row[j] = Math.min(change, 1 + Math.min(row[j], row[j - 1]));
      }
    }
    return row[b.length()];
  }

  /** The text as typed; blank when it is no scalar. */
  String text() {
    return node instanceof ScalarNode s ? s.getValue().trim() : "";
  }

  String text(String key, String otherwise) {
    return get(key).map(Key::scalar).orElse(otherwise);
  }

  private String scalar() {
    if (!isScalar()) {
      error("shape", "a single value is expected here.", "");
    }
    return text();
  }

  /** The SI value; NaN after an error. */
  double si(Dimension dimension) {
    if (!isScalar()) {
      error(
          "shape",
          "a value with a unit is expected here.",
          isList() ? "Put the unit inside: [0 deg, 90 deg]." : "");
      return Double.NaN;
    }
    try {
      return Quantities.read(text(), dimension);
    } catch (Quantities.Unreadable wrong) {
      boolean windForSpeed = wrong.id().equals("E6") && path.endsWith("rated.rotor-speed");
      error(wrong.id(), wrong.getMessage(), windForSpeed ? "The wind goes to `rated.wind`." : "");
      return Double.NaN;
    }
  }

  OptionalDouble value(String key, Dimension dimension) {
    Optional<Key> k = get(key);
    return k.isPresent() ? OptionalDouble.of(k.get().si(dimension)) : OptionalDouble.empty();
  }

  /** A value above zero. */
  OptionalDouble positive(String key, Dimension dimension) {
    OptionalDouble v = value(key, dimension);
    if (v.isPresent() && !(v.getAsDouble() > 0) && !Double.isNaN(v.getAsDouble())) {
      get(key).orElseThrow().error("range", "must be above zero.", "");
    }
    return v;
  }

  double required(String key, Dimension dimension, String what) {
    Optional<Key> k = need(key, "missing", what);
    if (k.isEmpty()) {
      return Double.NaN;
    }
    double v = k.get().si(dimension);
    if (!(v > 0) && !Double.isNaN(v)) {
      k.get().error("range", "must be above zero.", "");
    }
    return v;
  }

  int integer(String key, int otherwise) {
    return get(key).map(k -> k.wholeNumber(otherwise)).orElse(otherwise);
  }

  /** A whole number from nought up. */
  int wholeNumber(int otherwise) {
    if (text().matches("\\d{1,6}")) {
      return Integer.parseInt(text());
    }
    error("number", "\"" + text() + "\" is not a whole number.", "");
    return otherwise;
  }

  boolean yes(String key, boolean otherwise) {
    Optional<Key> k = get(key);
    if (k.isEmpty()) {
      return otherwise;
    }
    return switch (k.get().text()) {
      case "yes", "true" -> true;
      case "no", "false" -> false;
      default -> {
        k.get().error("number", "\"" + k.get().text() + "\" is neither yes nor no.", "");
        yield otherwise;
      }
    };
  }

  /** One of the words the catalogue lists for a key; blank when it is not there or not one. */
  String choice(String key) {
    Optional<Key> k = get(key);
    if (k.isEmpty()) {
      return "";
    }
    List<String> words =
        KeyCatalogue.at(join(key)).map(KeyCatalogue.Entry::choices).orElse(List.of());
    if (words.contains(k.get().text())) {
      return k.get().text();
    }
    k.get()
        .error(
            "choice",
            "\"" + k.get().text() + "\" is not known here.",
            "Write " + String.join(" or ", words) + ".");
    return "";
  }

  /** The same, with a word for when it is not there. */
  String choice(String key, String otherwise) {
    return has(key) ? choice(key) : otherwise;
  }

  /** A bearing in radians: degrees or a letter such as NNE. */
  double bearing() {
    int point = Compass.index(text());
    return point >= 0 ? point * Math.PI / 8 : si(Dimension.ANGLE);
  }

  /** A value printed in the unit this one is typed in. */
  String alike(double si, Dimension dimension) {
    return Quantities.unitOf(text(), dimension).print(si);
  }

  /** The same, rounded towards nought, for a limit that must not be passed. */
  String atMost(double si, Dimension dimension) {
    Unit unit = Quantities.unitOf(text(), dimension);
    BigDecimal cut = new BigDecimal(unit.fromSi(si)).round(new MathContext(3, RoundingMode.DOWN));
    return cut.toPlainString() + " " + unit.symbol();
  }

  /** Does something with a key when it is there. */
  void with(String key, BiConsumer<Key, Faults> use) {
    get(key).ifPresent(k -> use.accept(k, faults));
  }
}
