package org.mastwright.file;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.function.BiConsumer;
import org.mastwright.units.Dimension;
import org.mastwright.units.Quantities;
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

  /** A key of this mapping, if it is there. */
  Optional<Key> get(String key) {
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

  /** Keys that are known here though nothing is taken from them now. */
  void known(String... keys) {
    asked.addAll(List.of(keys));
  }

  /** Names this mapping holds. */
  List<Key> entries() {
    List<Key> all = new ArrayList<>();
    if (node instanceof MappingNode map) {
      for (NodeTuple t : map.getValue()) {
        if (t.getKeyNode() instanceof ScalarNode k) {
          all.add(new Key(join(k.getValue()), t.getKeyNode(), faults));
        }
      }
    }
    return all;
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

  /** Says which keys are not known here; call when all known ones were asked for. */
  void close() {
    if (node instanceof MappingNode map) {
      for (NodeTuple t : map.getValue()) {
        if (t.getKeyNode() instanceof ScalarNode k && !asked.contains(k.getValue())) {
          Key at = new Key(join(k.getValue()), t.getKeyNode(), faults);
          String near = nearest(k.getValue());
          at.error(
              "E5",
              at.path() + " is not a known key.",
              near.isEmpty()
                  ? "Known here: " + String.join(", ", asked)
                  : "Did you mean `" + near + "`?");
        }
      }
    } else if (!(node instanceof ScalarNode s && s.getValue().isEmpty())) {
      error("shape", "keys are expected here, such as " + String.join(", ", asked), "");
    }
  }

  private String nearest(String word) {
    String best = "";
    int least = 1 + word.length() / 2;
    for (String other : asked) {
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
      error(wrong.id(), wrong.getMessage(), "");
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
    Optional<Key> k = get(key);
    if (k.isEmpty()) {
      return otherwise;
    }
    try {
      return Integer.parseInt(k.get().text());
    } catch (NumberFormatException e) {
      k.get().error("number", "\"" + k.get().text() + "\" is not a whole number.", "");
      return otherwise;
    }
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

  /** A bearing in radians: degrees or a letter such as NNE. */
  double bearing() {
    List<String> letters =
        List.of(
            "N", "NNE", "NE", "ENE", "E", "ESE", "SE", "SSE", "S", "SSW", "SW", "WSW", "W", "WNW",
            "NW", "NNW");
    int i = letters.indexOf(text());
    return i >= 0 ? i * Math.PI / 8 : si(Dimension.ANGLE);
  }

  /** Does something with a key when it is there. */
  void with(String key, BiConsumer<Key, Faults> use) {
    get(key).ifPresent(k -> use.accept(k, faults));
  }
}
