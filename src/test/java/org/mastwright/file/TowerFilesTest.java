package org.mastwright.file;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotNull;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.mastwright.design.Design;
import org.mastwright.design.GuySet;
import org.mastwright.units.Dimension;
import org.mastwright.units.Quantities;
import org.mastwright.working.Finding;

/** What a tower file says, right and wrong. */
class TowerFilesTest {
  private static String example(String name) throws IOException {
    return Files.readString(Path.of("examples", name + ".yaml"));
  }

  private static Reading read(String text) {
    return TowerFiles.read("t.yaml", text.getBytes(StandardCharsets.UTF_8));
  }

  @Test
  void installersFileReadsAsWritten() throws IOException {
    Reading reading = read(example("gravel-bench"));
    assertEquals(
        0, reading.faults().stream().filter(f -> f.severity() == Finding.Severity.ERROR).count());
    Design d = reading.design().orElseThrow();
    assertEquals(60 * 0.3048, d.tower().length_m(), 1e-9);
    assertEquals(60.75 * 0.3048, d.tower().topHeight_m(), 1e-9);
    assertEquals(
        115 * 0.44704,
        ((org.mastwright.design.SiteWind.Stated.Speed) d.site().orElseThrow().wind().stated())
            .speed_mps(),
        1e-9);
    GuySet top = d.tower().guys().get(2);
    assertEquals(7000 * 4.4482216152605, top.rope().breaking_N(), 1e-3);
    // tape 36 ft, eye 1 ft down: level distance by Pythagoras
    assertEquals(Math.sqrt(36 * 36 - 1) * 0.3048, d.ground().anchors().get(1).out_m(), 1e-9);
    // pipe table: 4.500 in outside, 0.237 in wall, 7 % off for welded pipe
    assertEquals(0.1143, d.tower().tubes().get(0).bottom().outside_m(), 1e-9);
    assertEquals(0.237 * 0.93 * 0.0254, d.tower().tubes().get(0).bottom().wall_m(), 1e-9);
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "12.5 m|LENGTH|12.5",
        "5 ft 6 in|LENGTH|1.6764",
        "2-1/2 in|LENGTH|0.0635",
        "2 7/8 in|LENGTH|0.073025",
        "110 mph|SPEED|49.1744",
        "350 kgf|FORCE|3432.3275",
        "75 lb|FORCE|333.6166",
        "75 lb|MASS|34.01943",
        "145 pcf|DENSITY|2322.6778",
        "390 rpm|ROTATION_SPEED|40.8407",
        "15 degC|TEMPERATURE|288.15",
        "55 degF|TEMPERATURE|285.9278",
        "10 %|ONE|0.1",
        "350 ft-lb|MOMENT|474.5363",
        "100 psf/ft|PRESSURE_PER_LENGTH|15708.746",
        "25 MN.m/rad|ROTATIONAL_STIFFNESS|25e6",
        "12e-6 1/K|THERMAL_EXPANSION|12e-6"
      })
  void quantitiesWithTheirUnits(String text, Dimension dimension, double si)
      throws Quantities.Unreadable {
    assertEquals(si, Quantities.read(text, dimension), 1e-6 * Math.abs(si));
  }

  /** One change to a good file, the id it must be told by. */
  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "E1|harbour-workshop|diameter: 4.0 m|diameter: 4.0",
        "E2|harbour-workshop|return-period: 50 yr, |",
        "E3|harbour-workshop|altitude: 4 m|altitude: \"1,500 m\"",
        "E4|ridge-school|class: III|{class: III, reference: {speed: 24 m/s}}",
        "E5|harbour-workshop|overhang: 0.5 m|overhangg: 0.5 m",
        "E6|harbour-workshop|rotor-speed: 300 rpm|rotor-speed: 24 mph",
        "E7|ridge-school|held: 90 kN|held: 350 kg",
        "E8|gravel-bench|pipe: {nominal: 2-1/2 in, schedule: 80}|{outside: 4 in, wall: 6 mm}",
        "E9|harbour-workshop|wall: 10 mm, steel: S355|wall: 10 mm",
        "E10|ridge-school|height: 21.5 m|height: 23.5 m",
        "E11|ridge-school|height: 14.5 m|height: 66 m",
        "E12|ridge-school|tension: 4 kN, tension-at: anchor|tension: 4 kN",
        "E13|two-guys|radius: 12 m|radius: [12 m, 12 m, 12 m]",
        "E16|harbour-workshop|outside: 355.6 mm|outside: 355.6 mm, shape: polygon-12",
        "E20|harbour-workshop|kind: monopole|kind: lattice",
        "E19|gravel-bench|rod-length: 48 in, angle: in-line, torque|rod-length: 48 in, depth: 48 in, torque",
        "duplicate|harbour-workshop|cut-in: 3 m/s|cut-in: 3 m/s, cut-in: 4 m/s",
        "basis-not-built|harbour-workshop|loads: iec-61400-2|loads: en-1991-1-4",
        "choice|harbour-workshop|averaging: 10 min|averaging: 10 minutes",
        "missing|harbour-workshop|hub-above-top: 0.45 m, |"
      })
  void eachMistakeIsToldByItsId(String id, String name, String from, String to) throws IOException {
    String text = example(name);
    assertTrue(text.contains(from), from);
    String wrong =
        text.replaceFirst(
            java.util.regex.Pattern.quote(from),
            java.util.regex.Matcher.quoteReplacement(to == null ? "" : to));
    if (id.equals("E4") || id.equals("E8")) {
      wrong = unwrapped(wrong);
    }
    Reading reading = read(wrong);
    assertTrue(reading.design().isEmpty(), id);
    assertTrue(
        reading.faults().stream().anyMatch(f -> f.id().equals(id) && f.line() > 0),
        id + " in " + reading.faults());
  }

  /** Braces put round several keys for the table above are taken off again. */
  private static String unwrapped(String text) {
    return text.replace(
            "{class: III, reference: {speed: 24 m/s}}",
            "class: III\n    reference: {speed: 24 m/s}")
        .replace("{outside: 4 in, wall: 6 mm}", "outside: 4 in, wall: 6 mm");
  }

  @Test
  void unsafeSilenceIsAnOpenPoint() throws IOException {
    String text = example("harbour-workshop").replace("  ice: {none: true}\n", "");
    assertTrue(
        read(text).findings().stream()
            .anyMatch(
                f ->
                    f.id().equals("ice-not-stated")
                        && f.severity() == Finding.Severity.OPEN_POINT));
  }

  @Test
  void mutatedFilesNeverThrow() throws IOException {
    Random random = new Random(17);
    String[] seeds = {example("gravel-bench"), example("harbour-workshop"), example("two-guys")};
    String alphabet = "abcxyz019.,:-{}[]#\"'&*!|>%@ \n\t";
    for (int i = 0; i < 10_000; i++) {
      StringBuilder text = new StringBuilder(seeds[i % seeds.length]);
      int changes = 1 + random.nextInt(4);
      for (int c = 0; c < changes; c++) {
        int at = random.nextInt(text.length());
        switch (random.nextInt(3)) {
          case 0 -> text.deleteCharAt(at);
          case 1 -> text.insert(at, alphabet.charAt(random.nextInt(alphabet.length())));
          default -> text.setCharAt(at, alphabet.charAt(random.nextInt(alphabet.length())));
        }
      }
      Reading reading = read(text.toString());
      assertNotNull(reading);
      assertTrue(reading.design().isPresent() || !reading.faults().isEmpty());
    }
  }
}
