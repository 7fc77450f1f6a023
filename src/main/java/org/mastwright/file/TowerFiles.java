package org.mastwright.file;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HexFormat;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.mastwright.design.Design;
import org.mastwright.working.Finding;
import org.snakeyaml.engine.v2.api.LoadSettings;
import org.snakeyaml.engine.v2.api.lowlevel.Compose;
import org.snakeyaml.engine.v2.exceptions.MarkedYamlEngineException;
import org.snakeyaml.engine.v2.exceptions.YamlEngineException;
import org.snakeyaml.engine.v2.nodes.MappingNode;
import org.snakeyaml.engine.v2.nodes.Node;
import org.snakeyaml.engine.v2.nodes.NodeTuple;
import org.snakeyaml.engine.v2.nodes.ScalarNode;
import org.snakeyaml.engine.v2.nodes.SequenceNode;

/** Reads tower files; never throws for what a file holds. */
public final class TowerFiles {
  private static final int MOST_BYTES = 1_000_000;
  private static final int DEEPEST = 12;

  private TowerFiles() {}

  /** Reads the bytes of a file that lies nowhere: tables beside it cannot be read. */
  public static Reading read(String name, byte[] content) {
    return read(name, content, Optional.empty());
  }

  /** Reads the bytes of a file; {@code folder} is where tables beside it may lie. */
  public static Reading read(String name, byte[] content, Optional<Path> folder) {
    Faults faults = new Faults(folder);
    Optional<Design> design = Optional.empty();
    Optional<Node> root = compose(content, faults);
    if (root.isPresent()) {
      Key top = new Key("", root.get(), faults);
      duplicates(root.get(), "", faults, 0);
      if (!faults.hasErrors()) {
        design = Optional.ofNullable(bind(top, faults));
      }
    }
    List<Finding> sorted = new ArrayList<>(faults.all);
    sorted.sort(
        Comparator.comparing((Finding f) -> f.severity() != Finding.Severity.ERROR)
            .thenComparingInt(Finding::line)
            .thenComparingInt(Finding::column));
    return new Reading(
        faults.hasErrors() ? Optional.empty() : design,
        sorted,
        faults.findings,
        faults.defaults,
        name,
        sha256(content));
  }

  private static Design bind(Key top, Faults faults) {
    try {
      return new DesignReader(top).read();
    } catch (IllegalArgumentException wrong) {
      // a record refused a value; NaN stands where an error was told already
      if (!faults.hasErrors()) {
        top.error("value", String.valueOf(wrong.getMessage()), "");
      }
      return null;
    }
  }

  private static String sha256(byte[] content) {
    try {
      return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(content));
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException(e);
    }
  }

  private static void whole(Faults faults, String id, int line, int column, String message) {
    faults.all.add(new Finding(id, Finding.Severity.ERROR, "", line, column, message, ""));
  }

  private static Optional<Node> compose(byte[] content, Faults faults) {
    if (content.length > MOST_BYTES) {
      whole(faults, "size", 0, 0, "The file is larger than 1 MB: no tower file is.");
      return Optional.empty();
    }
    String text = new String(content, StandardCharsets.UTF_8);
    int line = 1;
    for (String l : text.split("\n", -1)) {
      if (l.stripLeading().length() < l.length()
          && l.substring(0, l.length() - l.stripLeading().length()).contains("\t")) {
        whole(faults, "tab", line, 1, "line " + line + " begins with a tab; use spaces");
        return Optional.empty();
      }
      line++;
    }
    LoadSettings settings =
        LoadSettings.builder()
            .setMaxAliasesForCollections(20)
            .setCodePointLimit(MOST_BYTES)
            .setAllowDuplicateKeys(true)
            .setLabel("tower file")
            .build();
    try {
      Optional<Node> node = new Compose(settings).composeString(text);
      if (node.isEmpty() || !(node.get() instanceof MappingNode)) {
        whole(faults, "shape", 1, 1, "The file holds no keys. Start with  tower-file: 1");
        return Optional.empty();
      }
      return node;
    } catch (MarkedYamlEngineException wrong) {
      int at = wrong.getProblemMark().map(m -> m.getLine() + 1).orElse(0);
      int column = wrong.getProblemMark().map(m -> m.getColumn() + 1).orElse(0);
      String hint =
          wrong.getProblem().contains("mapping values are not allowed")
              ? " A text with a colon in it needs quotes round it."
              : wrong.getProblem().contains("expected <block end>")
                  ? " If a list has its unit outside, put it inside: [0 deg, 90 deg]."
                  : "";
      whole(faults, "yaml", at, column, "This is not YAML: " + wrong.getProblem() + "." + hint);
    } catch (YamlEngineException
        | IndexOutOfBoundsException
        | ClassCastException
        | StackOverflowError wrong) {
      whole(faults, "yaml", 0, 0, "This is not YAML: " + wrong.getMessage());
    }
    return Optional.empty();
  }

  /** Names given twice, and nesting deeper than any tower file. */
  private static void duplicates(Node node, String path, Faults faults, int depth) {
    if (depth > DEEPEST) {
      if (!faults.hasErrors()) {
        new Key(path, node, faults).error("depth", "is nested too deep.", "");
      }
      return;
    }
    if (node instanceof SequenceNode list) {
      list.getValue().forEach(n -> duplicates(n, path + "[]", faults, depth + 1));
    }
    if (node instanceof MappingNode map) {
      Map<String, Integer> seen = new LinkedHashMap<>();
      for (NodeTuple t : map.getValue()) {
        if (!(t.getKeyNode() instanceof ScalarNode k)) {
          new Key(path, t.getKeyNode(), faults).error("shape", "a key must be a word.", "");
          continue;
        }
        String name = path.isEmpty() ? k.getValue() : path + "." + k.getValue();
        Key key = new Key(name, k, faults);
        Integer before = seen.put(k.getValue(), key.line());
        if (before != null) {
          key.error(
              "duplicate", name + " is given twice, here and in line " + before + ".", "Keep one.");
        }
        if (t.getValueNode() instanceof ScalarNode v && v.getValue().isEmpty() && isCut(v)) {
          key.error(
              "cut",
              name + " has no value.",
              "An unquoted # after a space starts a comment; a comma in braces ends a value. Put"
                  + " quotes round the text.");
        }
        duplicates(t.getValueNode(), name, faults, depth + 1);
      }
    }
  }

  private static boolean isCut(ScalarNode v) {
    return v.isPlain();
  }
}
