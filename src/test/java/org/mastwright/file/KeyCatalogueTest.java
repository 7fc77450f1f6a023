package org.mastwright.file;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.networknt.schema.Error;
import com.networknt.schema.InputFormat;
import com.networknt.schema.Schema;
import com.networknt.schema.SchemaRegistry;
import com.networknt.schema.SpecificationVersion;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.mastwright.units.Dimension;
import org.mastwright.working.Finding;
import org.snakeyaml.engine.v2.api.Load;
import org.snakeyaml.engine.v2.api.LoadSettings;
import tools.jackson.databind.json.JsonMapper;

/** The catalogue of keys, the schema made from it, and what a file says that nothing uses. */
class KeyCatalogueTest {
  private static final Schema SCHEMA =
      SchemaRegistry.withDefaultDialect(SpecificationVersion.DRAFT_2020_12)
          .getSchema(new String(TowerFileSchema.bytes(), StandardCharsets.UTF_8), InputFormat.JSON);

  static Stream<Path> examples() throws IOException {
    try (Stream<Path> files = Files.list(Path.of("examples"))) {
      return files.filter(f -> f.toString().endsWith(".yaml")).sorted().toList().stream();
    }
  }

  private static List<Error> faults(String yaml) {
    Object tree = new Load(LoadSettings.builder().build()).loadFromString(yaml);
    return SCHEMA.validate(JsonMapper.shared().writeValueAsString(tree), InputFormat.JSON);
  }

  @ParameterizedTest
  @MethodSource("examples")
  void everyExampleFitsTheSchema(Path example) throws IOException {
    assertEquals(List.of(), faults(Files.readString(example)));
  }

  /** The schema is no sieve: a validator that is not ours refuses what is wrong. */
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "overhang: 0.5 m|overhangg: 0.5 m",
        "diameter: 4.0 m|diameter: 4.0",
        "diameter: 4.0 m|diameter: 4.0 mph",
        "kind: monopole|kind: lattice",
        "blades: 3|blades: three",
        "averaging: 10 min|averaging: 10 minutes"
      })
  void schemaRefusesWhatIsWrong(String from, String to) throws IOException {
    String good = Files.readString(Path.of("examples/harbour-workshop.yaml"));
    assertTrue(good.contains(from), from);
    assertFalse(faults(good.replace(from, to)).isEmpty());
  }

  private static void walk(KeyCatalogue.Entry e, List<KeyCatalogue.Entry> all) {
    e.keys()
        .values()
        .forEach(
            k -> {
              all.add(k);
              walk(k, all);
            });
  }

  @Test
  void everyKeySaysWhatItIs() {
    List<KeyCatalogue.Entry> all = new java.util.ArrayList<>();
    walk(KeyCatalogue.root(), all);
    List<String> others = List.of("text", "choice", "yes-no", "whole", "date", "bearing", "share");
    List<String> dimensions =
        Stream.of(Dimension.values())
            .map(d -> d.name().toLowerCase(Locale.ROOT).replace('_', '-'))
            .toList();
    for (KeyCatalogue.Entry e : all) {
      assertTrue(e.says().endsWith("."), e.path());
      assertFalse(e.kinds().isEmpty() && e.keys().isEmpty(), e.path());
      for (String kind : e.kinds()) {
        assertTrue(others.contains(kind) || dimensions.contains(kind), e.path() + " " + kind);
        assertEquals(kind.equals("choice"), !e.choices().isEmpty() && kind.equals("choice"));
      }
      assertFalse(Explain.key(e.path()).isEmpty(), e.path());
    }
    assertTrue(all.size() > 300);
  }

  @Test
  void aWordExplainsEveryKeyOfThatName() {
    String words = String.join("\n", Explain.key("tension"));
    assertTrue(words.contains("tower.guys.tension"), words);
    assertTrue(words.contains("never guessed"), words);
    assertTrue(words.contains("How to find it"), words);
    assertTrue(Explain.key("site.wind.reference.averaging").get(0).contains("fastest-mile"));
    assertTrue(Explain.key("no-such-key").isEmpty());
  }

  private static Reading read(String text) {
    return TowerFiles.read("t.yaml", text.getBytes(StandardCharsets.UTF_8));
  }

  @Test
  void whatNothingUsesIsListedAndOpenWhereItMatters() throws IOException {
    Reading reading = read(Files.readString(Path.of("examples/gravel-bench.yaml")));
    List<String> listed =
        reading.findings().stream()
            .filter(f -> f.id().equals("read-not-used"))
            .map(Finding::path)
            .toList();
    assertTrue(
        listed.containsAll(List.of("site.soil", "ground.foundation", "ground.anchors[1].screw")),
        listed.toString());
    String shaken =
        Files.readString(Path.of("examples/harbour-workshop.yaml"))
            .replace("  ice: {none: true}", "  ice: {none: true}\n  seismic: {sds: 0.25 g}");
    assertTrue(
        read(shaken).findings().stream()
            .anyMatch(
                f ->
                    f.path().equals("site.seismic")
                        && f.severity() == Finding.Severity.OPEN_POINT));
  }

  /** Typing errors deep in parts that nothing is calculated from are told all the same. */
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "class: clay-firm|class: clay-frm|site.soil.class",
        "lateral-bearing: 100 psf/ft|lateral-bearing: 100 psf|site.soil.lateral-bearing",
        "stands-out: 9 in|stand-out: 9 in|ground.foundation.pad.stand-out",
        "strength: 3000 psi|strength: 3000|ground.foundation.concrete.strength",
        "bolt-circle: 11 in|bolt-cirle: 11 in|tower.joints[1].bolt-cirle",
        "thread: tapered|thread: conical|tower.joints[2].thread",
        "helix: 6 in|helix: 6 lb|ground.anchors[1].screw.helix",
        "top-below-ground: 1 ft|top-underground: 1 ft|ground.anchors[2].block.top-underground",
        "rating: 3500 lb|rating: 3500 kg|raising.winch.rating",
        "back-guy: east|back-guy: eest|raising.back-guy",
        "{to-set: 3, stays|{to-set: 4, stays|raising.lines[3].to-set"
      })
  void typingErrorsInUnusedPartsAreTold(String from, String to, String path) throws IOException {
    String good = Files.readString(Path.of("examples/gravel-bench.yaml"));
    assertTrue(good.contains(from), from);
    List<Finding> faults =
        read(good.replaceFirst(java.util.regex.Pattern.quote(from), to)).faults();
    assertTrue(
        faults.stream()
            .anyMatch(
                f ->
                    f.severity() == Finding.Severity.ERROR
                        && f.path().equals(path)
                        && f.line() > 0),
        faults.toString());
  }
}
