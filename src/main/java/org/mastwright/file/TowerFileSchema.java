package org.mastwright.file;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import org.mastwright.units.Dimension;
import org.mastwright.units.Quantities;
import tools.jackson.databind.SerializationFeature;
import tools.jackson.databind.json.JsonMapper;

/**
 * The JSON Schema (draft 2020-12) of a tower file, for editors that complete and underline. It is
 * made from the same catalogue of keys that the reader refuses unknown keys by; what depends on
 * several keys at once, only the reader tells.
 */
public final class TowerFileSchema {
  private static final String NUMBER =
      "[-+]?(\\d+[ -]\\d+/\\d+|\\d+/\\d+|\\d+\\.?\\d*([eE][-+]?\\d+)?|\\.\\d+([eE][-+]?\\d+)?)";

  private TowerFileSchema() {}

  /** The schema as text. */
  public static byte[] bytes() {
    Map<String, Object> schema = new LinkedHashMap<>();
    schema.put("$schema", "https://json-schema.org/draft/2020-12/schema");
    schema.put("title", "Tower file, format 1");
    schema.putAll(mapping(KeyCatalogue.root()));
    schema.put("$defs", definitions());
    String text =
        JsonMapper.builder()
            .enable(SerializationFeature.INDENT_OUTPUT)
            .build()
            .writeValueAsString(schema)
            .replace("\r\n", "\n");
    return (text + "\n").getBytes(StandardCharsets.UTF_8);
  }

  private static Map<String, Object> map(Object... pairs) {
    Map<String, Object> m = new LinkedHashMap<>();
    for (int i = 0; i < pairs.length; i += 2) {
      m.put((String) pairs[i], pairs[i + 1]);
    }
    return m;
  }

  private static Map<String, Object> mapping(KeyCatalogue.Entry e) {
    Map<String, Object> properties = new LinkedHashMap<>();
    e.keys().forEach((name, key) -> properties.put(name, property(key)));
    List<String> required =
        e.keys().values().stream()
            .filter(KeyCatalogue.Entry::must)
            .map(KeyCatalogue.Entry::name)
            // a verification file has neither site nor turbine nor basis
            .filter(
                n -> !e.path().isEmpty() || List.of("tower-file", "project", "tower").contains(n))
            .toList();
    Map<String, Object> m = map("type", "object", "properties", properties);
    if (!required.isEmpty()) {
      m.put("required", required);
    }
    m.put("additionalProperties", false);
    return m;
  }

  private static Map<String, Object> property(KeyCatalogue.Entry e) {
    List<Object> forms = new ArrayList<>();
    for (String kind : e.kinds()) {
      forms.add(plain(kind, e));
    }
    if (!e.keys().isEmpty()) {
      forms.add(mapping(e));
    }
    Object one = forms.size() == 1 ? forms.get(0) : map("anyOf", forms);
    Map<String, Object> m = map("description", Explain.inOneLine(e));
    Map<String, Object> several = map("type", "array", "minItems", 1, "items", one);
    switch (e.many()) {
      case ONE -> m.putAll(forms.size() == 1 ? cast(one) : map("anyOf", forms));
      case ONE_OR_SEVERAL -> m.put("anyOf", List.of(one, several));
      case SEVERAL -> m.putAll(map("type", "array", "items", map("anyOf", List.of(one, several))));
    }
    return m;
  }

  @SuppressWarnings("unchecked")
  private static Map<String, Object> cast(Object map) {
    return (Map<String, Object>) map;
  }

  private static Map<String, Object> plain(String kind, KeyCatalogue.Entry e) {
    return switch (kind) {
      case "text" -> map("type", List.of("string", "number", "boolean"));
      case "choice" -> choice(e.choices());
      case "yes-no" -> map("enum", List.of(true, false, "yes", "no"));
      case "whole" -> map("type", "integer", "minimum", 0);
      case "date" -> map("type", "string", "pattern", "^\\d{4}-\\d{2}-\\d{2}$");
      default -> map("$ref", "#/$defs/" + kind);
    };
  }

  /** Words that YAML may read as numbers are allowed as numbers too. */
  private static Map<String, Object> choice(List<String> words) {
    List<Object> all = new ArrayList<>(words);
    words.stream().filter(w -> w.matches("\\d+")).forEach(w -> all.add(Integer.parseInt(w)));
    return map("enum", all);
  }

  private static Map<String, Object> definitions() {
    Map<String, Object> all = new LinkedHashMap<>();
    for (Dimension d : Dimension.values()) {
      String name = d.name().toLowerCase(Locale.ROOT).replace('_', '-');
      String units =
          List.of(Quantities.accepted(d).split(", ")).stream()
              .map(Pattern::quote)
              .map(TowerFileSchema::unquoted)
              .collect(Collectors.joining("|"));
      String pattern = "^\\s*(" + NUMBER + "\\s*(" + units + ")\\s*)+$";
      if (d == Dimension.ONE) {
        all.put(
            "one",
            map(
                "anyOf",
                List.of(
                    map("type", "number"),
                    map("type", "string", "pattern", "^\\s*" + NUMBER + "\\s*%?$"))));
      } else if (!units.isEmpty()) {
        all.put(
            name,
            map(
                "type",
                "string",
                "description",
                "A number with its unit: " + Quantities.accepted(d) + ".",
                "pattern",
                pattern));
      }
    }
    all.put(
        "bearing",
        map(
            "anyOf",
            List.of(
                map("$ref", "#/$defs/angle"), map("type", "string", "pattern", "^[NESW]{1,3}$"))));
    all.put("share", map("type", "string", "pattern", "^" + NUMBER + "\\s*% of breaking$"));
    return all;
  }

  /** What {@link Pattern#quote} wrapped, escaped sign by sign, as every editor understands it. */
  private static String unquoted(String quoted) {
    String word = quoted.substring(2, quoted.length() - 2);
    return word.replaceAll("([\\\\.^$*+?()\\[\\]{}|/])", "\\\\$1");
  }
}
