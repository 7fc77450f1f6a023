package org.mastwright.file;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.snakeyaml.engine.v2.api.Load;
import org.snakeyaml.engine.v2.api.LoadSettings;

/**
 * Every key of a tower file, from the page {@code keys.yaml}: the reader knows no other, and {@code
 * explain} and {@code schema} are made from it.
 */
public final class KeyCatalogue {
  private static final String PAGE = "/org/mastwright/file/keys.yaml";
  private static final Entry ROOT = load();

  private KeyCatalogue() {}

  /** What becomes of a key that is given. */
  public enum Use {
    /** Something is calculated or printed from it. */
    USED,
    /** Read and kept; nothing is calculated from it yet. */
    NOTED,
    /** The same, and it could matter to the verdict, which is then at best incomplete. */
    OPEN
  }

  /** Whether a key takes one value, or several in brackets. */
  public enum Many {
    ONE,
    ONE_OR_SEVERAL,
    SEVERAL
  }

  /**
   * One key.
   *
   * @param path from the top, without list numbers, such as {@code tower.guys.tension}
   * @param kinds of a plain value: dimensions, {@code text}, {@code choice} and the like; empty for
   *     a mapping only
   * @param choices words of a {@code choice}
   * @param must whether the file is refused without it
   * @param keys of the mapping it may be, in order; empty for a plain value
   */
  public record Entry(
      String path,
      List<String> kinds,
      List<String> choices,
      Many many,
      boolean must,
      String says,
      String measure,
      String otherwise,
      Use use,
      Map<String, Entry> keys) {
    public Entry {
      kinds = List.copyOf(kinds);
      choices = List.copyOf(choices);
      keys = java.util.Collections.unmodifiableMap(new LinkedHashMap<>(keys));
    }

    /** The last word of the path. */
    public String name() {
      return path.substring(path.lastIndexOf('.') + 1);
    }
  }

  /** The whole file as one mapping. */
  public static Entry root() {
    return ROOT;
  }

  /** The entry at a path, with or without list numbers. */
  public static Optional<Entry> at(String path) {
    Entry e = ROOT;
    for (String word : path.isEmpty() ? new String[0] : plain(path).split("\\.")) {
      e = e.keys().get(word);
      if (e == null) {
        return Optional.empty();
      }
    }
    return Optional.of(e);
  }

  /** Entries whose path is the words given or ends with them, in the order of the page. */
  public static List<Entry> named(String words) {
    List<Entry> found = new ArrayList<>();
    collect(ROOT, plain(words), found);
    return found;
  }

  private static void collect(Entry e, String words, List<Entry> found) {
    if (e.path().equals(words) || e.path().endsWith("." + words)) {
      found.add(e);
    }
    e.keys().values().forEach(k -> collect(k, words, found));
  }

  private static String plain(String path) {
    return path.replaceAll("\\[[^\\]]*\\]", "");
  }

  private static Entry load() {
    try (InputStream in = KeyCatalogue.class.getResourceAsStream(PAGE)) {
      Map<?, ?> page = (Map<?, ?>) new Load(LoadSettings.builder().build()).loadFromInputStream(in);
      Map<?, ?> shapes = (Map<?, ?>) page.get("shapes");
      return new Entry(
          "",
          List.of(),
          List.of(),
          Many.ONE,
          true,
          "One tower.",
          "",
          "",
          Use.USED,
          keys("", (Map<?, ?>) page.get("keys"), shapes));
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static Map<String, Entry> keys(String path, Map<?, ?> of, Map<?, ?> shapes) {
    Map<String, Entry> all = new LinkedHashMap<>();
    of.forEach(
        (name, entry) ->
            all.put(
                name.toString(),
                entry(path.isEmpty() ? name.toString() : path + "." + name, entry, shapes)));
    return all;
  }

  private static Entry entry(String path, Object given, Map<?, ?> shapes) {
    Map<?, ?> e = (Map<?, ?>) given;
    Map<String, Entry> below = new LinkedHashMap<>();
    if (e.get("keys") instanceof Map<?, ?> own) {
      below.putAll(keys(path, own, shapes));
    }
    if (e.get("as") != null) {
      below.putAll(keys(path, (Map<?, ?>) shapes.get(e.get("as")), shapes));
    }
    return new Entry(
        path,
        words(e.get("is")),
        words(e.get("of")),
        switch (word(e, "list")) {
          case "yes" -> Many.ONE_OR_SEVERAL;
          case "only" -> Many.SEVERAL;
          default -> Many.ONE;
        },
        word(e, "must").equals("yes"),
        word(e, "says"),
        word(e, "measure"),
        word(e, "default"),
        switch (word(e, "unused")) {
          case "note" -> Use.NOTED;
          case "open" -> Use.OPEN;
          default -> Use.USED;
        },
        below);
  }

  private static String word(Map<?, ?> e, String key) {
    return e.get(key) == null ? "" : e.get(key).toString();
  }

  private static List<String> words(Object value) {
    List<String> all = new ArrayList<>();
    if (value instanceof List<?> list) {
      list.forEach(v -> all.add(v.toString()));
    } else if (value != null) {
      all.add(value.toString());
    }
    return all;
  }
}
