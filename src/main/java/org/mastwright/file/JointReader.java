package org.mastwright.file;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.mastwright.design.Joint;
import org.mastwright.units.Dimension;

/** Where tubes meet, and the plates at foot and head. */
final class JointReader {
  private static final List<String> LENGTHS =
      List.of("size", "plate", "outside", "thickness", "bolt", "bolt-circle", "gap", "overlap");
  private static final List<String> WORDS = List.of("shape", "grout", "thread");

  private JointReader() {}

  static Optional<Joint> read(Key k, MastPlaces places) {
    double along = places.along(k);
    k.need("kind", "missing", "What kind of joint is it?");
    String word = k.choice("kind");
    Map<String, Double> lengths = new LinkedHashMap<>();
    Map<String, String> words = new LinkedHashMap<>();
    for (String key : LENGTHS) {
      k.value(key, Dimension.LENGTH).ifPresent(v -> lengths.put(key, v));
    }
    for (String key : WORDS) {
      String value = k.choice(key);
      if (!value.isEmpty()) {
        words.put(key, value);
      }
    }
    String grade = k.text("grade", "");
    if (!grade.isEmpty()) {
      words.put("grade", grade);
    }
    k.get("weld").ifPresent(w -> weld(w, lengths, words));
    k.get("rods").ifPresent(r -> rods(r, lengths, words));
    Optional<Joint> joint = Optional.empty();
    if (!word.isEmpty()) {
      Joint.Kind kind =
          Joint.Kind.valueOf(word.toUpperCase(java.util.Locale.ROOT).replace('-', '_'));
      joint =
          Optional.of(
              new Joint(
                  along,
                  kind,
                  k.positive("detail-category", Dimension.PRESSURE),
                  k.positive("preload", Dimension.FORCE),
                  lengths,
                  words,
                  k.integer("bolts", 0)));
    }
    k.close();
    return joint;
  }

  private static void weld(Key w, Map<String, Double> lengths, Map<String, String> words) {
    String kind = w.choice("kind");
    if (!kind.isEmpty()) {
      words.put("weld", kind);
    }
    w.positive("leg", Dimension.LENGTH).ifPresent(v -> lengths.put("weld leg", v));
    w.positive("throat", Dimension.LENGTH).ifPresent(v -> lengths.put("weld throat", v));
    w.close();
  }

  private static void rods(Key r, Map<String, Double> lengths, Map<String, String> words) {
    r.positive("embedded", Dimension.LENGTH).ifPresent(v -> lengths.put("rods embedded", v));
    String end = r.choice("end");
    if (!end.isEmpty()) {
      words.put("rods end", end);
    }
    r.close();
  }
}
