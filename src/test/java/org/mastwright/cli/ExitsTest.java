package org.mastwright.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import java.util.concurrent.TimeUnit;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;

/** How runs end: collapse, mechanism, interrupt, outputs that cannot be written, mutated files. */
class ExitsTest {
  @TempDir Path folder;

  private final ByteArrayOutputStream out = new ByteArrayOutputStream();
  private final ByteArrayOutputStream err = new ByteArrayOutputStream();

  private int run(String... args) {
    out.reset();
    err.reset();
    return Mastwright.run(
        new PrintStream(out, true, StandardCharsets.UTF_8),
        new PrintStream(err, true, StandardCharsets.UTF_8),
        args);
  }

  private String told() {
    return err.toString(StandardCharsets.UTF_8);
  }

  private Path file(String text) throws IOException {
    return Files.writeString(folder.resolve("tower.yaml"), text);
  }

  private static String harbour() throws IOException {
    return Files.readString(Path.of("examples/harbour-workshop.yaml"));
  }

  private static String poleOf(String outside, String wall) throws IOException {
    return harbour()
        .replaceAll(
            "outside: [0-9.]+ mm, wall: [0-9.]+ mm, steel: S355",
            "outside: " + outside + ", wall: " + wall + ", steel: S355")
        .replaceAll("    - \\{height: 5 m, kind: flange.*\\n", "")
        .replaceAll("    - \\{height: 9 m, kind: flange.*\\n", "");
  }

  /** A pole that stands in still air and folds in the storm: exit 1, the last balance reported. */
  @Test
  void poleThatFoldsUnderTheStormFailsWithItsLastEquilibrium() throws IOException {
    Path tower = file(poleOf("114.3 mm", "3.6 mm"));
    Path into = folder.resolve("out");
    assertEquals(Exit.FAILS, run("check", tower.toString(), "--into", into.toString()), told());
    String results = Files.readString(into.resolve("results.json"));
    assertTrue(results.contains("\"verdict\" : \"fail\""));
    assertTrue(results.matches("(?s).*\"id\" : \"stability-limit\".{0,900}?\"fail\".*"));
    assertTrue(results.matches("(?s).*\"limit_points\" : \\[ \\{\\s+\"case\".*"));
    // nothing that rests on the lost cases may read as passed
    assertFalse(
        results.matches("(?s).*\"id\" : \"tube-strength\"((?!\"id\").)*\"outcome\" : \"pass\".*"));
    assertTrue(out.toString(StandardCharsets.UTF_8).contains("DOES NOT PASS"));
    assertTrue(Files.size(into.resolve("report.pdf")) > 10_000);
  }

  @Test
  void mechanismEndsWith4AndASentenceToActOn() throws IOException {
    Path tower = file(harbour().replaceAll("base: \\{[^}]*\\}", "base: pinned"));
    Path into = folder.resolve("out");
    assertEquals(Exit.NO_EQUILIBRIUM, run("check", tower.toString(), "--into", into.toString()));
    assertTrue(told().contains("No equilibrium in still air"), told());
    assertTrue(told().contains("Likely: a mechanism"), told());
    assertFalse(Files.exists(into));
  }

  /** Free to turn about one level axis, held about the other: still a mechanism. */
  @Test
  void hingedPoleEndsWith4() throws IOException {
    Path tower = file(harbour().replaceAll("base: \\{[^}]*\\}", "base: {hinged: {axis: 30 deg}}"));
    assertEquals(Exit.NO_EQUILIBRIUM, run("check", tower.toString()));
  }

  /** Past its own buckling load before any wind blows. */
  @Test
  void poleThatCannotCarryItsHeadEndsWith4() throws IOException {
    Path tower = file(poleOf("48.3 mm", "2.6 mm"));
    assertEquals(Exit.NO_EQUILIBRIUM, run("check", tower.toString()));
    assertTrue(told().contains("buckles under its own weight"), told());
  }

  @Test
  void outputThatCannotBeWrittenEndsWith5() throws IOException {
    Path inTheWay = Files.writeString(folder.resolve("letter.txt"), "mine");
    String into = inTheWay.toString();
    assertEquals(Exit.NOT_WRITTEN, run("check", "examples/two-guys.yaml", "--into", into));
    assertEquals(
        Exit.NOT_WRITTEN,
        run("check", "examples/two-guys.yaml", "--into", inTheWay.resolve("x").toString()));
    assertEquals("mine", Files.readString(inTheWay));
  }

  @Test
  void ownOutputIsReplacedWholeAndNothingElseIsLeft() throws IOException {
    Path into = folder.resolve("out");
    run("check", "examples/two-guys.yaml", "--into", into.toString());
    Files.writeString(into.resolve("guys.csv"), "old");
    assertEquals(0, run("check", "examples/two-guys.yaml", "--into", into.toString()));
    try (Stream<Path> list = Files.list(into)) {
      assertEquals(
          List.of("guys.csv", "results.json", "tower-file.yaml"),
          list.map(p -> p.getFileName().toString()).sorted().toList());
    }
    assertTrue(Files.readString(into.resolve("guys.csv")).startsWith("case,wind_from_deg,set,"));
  }

  @Test
  void standardInputIsRead() throws IOException {
    InputStream before = System.in;
    try {
      System.setIn(new ByteArrayInputStream(Files.readAllBytes(Path.of("examples/two-guys.yaml"))));
      assertEquals(0, run("check", "-", "--into", folder.resolve("in").toString()));
    } finally {
      System.setIn(before);
    }
    assertTrue(Files.readString(folder.resolve("in/results.json")).contains("standard-input.yaml"));
  }

  @Test
  void strictStopsAtWarnings() throws IOException {
    Path tower = file(harbour().replace("  foot-level: 0 m\n", "  damping-ratio: 1.2 %\n"));
    assertEquals(Exit.WRONG_FILE, run("check", tower.toString(), "--strict"));
    assertTrue(told().contains("log-decrement: 0.012"), told());
  }

  @Test
  void rotorOutsideTheModelHasNoVerdict() throws IOException {
    Path tower =
        file(
            harbour()
                .replace("kind: propeller, blades: 3", "kind: multi-blade, blades: 18")
                .replace("area-per-blade: 0.26 m^2", "solidity: 60 %")
                .replace(
                    "{lowest: 235 rpm, highest: 320 rpm}", "{lowest: 203 rpm, highest: 208 rpm}"));
    int code = run("check", tower.toString(), "--into", folder.resolve("out").toString());
    assertEquals(Exit.INCOMPLETE, code, told());
    String results = Files.readString(folder.resolve("out/results.json"));
    assertTrue(results.contains("\"cases\" : [ ]"), "no case is calculated outside the model");
    assertTrue(results.contains("this rotor is outside it"));
    String said = out.toString(StandardCharsets.UTF_8);
    assertTrue(said.contains("Use the loads of en-1991-1-4 or asce-7-16"), said);
  }

  @Test
  void readbackCalculatesAndWritesNothing() throws IOException {
    assertEquals(0, run("readback", "examples/gravel-bench.yaml"));
    String said = out.toString(StandardCharsets.UTF_8);
    assertTrue(said.contains("12 guys end at 4 anchors, not 12"), said);
    assertTrue(said.contains("ASK      east anchor eye"), said);
    assertTrue(said.contains("Nothing was calculated"), said);
    for (String line : said.split("\n")) {
      assertTrue(line.length() <= 80, line);
    }
    assertEquals(0, run("readback", "examples/gravel-bench.yaml", "--plain"));
    assertTrue(out.toString(StandardCharsets.UTF_8).chars().allMatch(c -> c < 128));
    assertFalse(Files.exists(Path.of("gravel-bench-check")));
  }

  @Test
  void speedsLooksAtSpeedsAlone() throws IOException {
    Path into = folder.resolve("speeds");
    int code = run("speeds", "examples/ridge-school.yaml", "--into", into.toString());
    assertEquals(Exit.PASSES, code, told());
    String said = out.toString(StandardCharsets.UTF_8);
    assertTrue(said.contains("AVOID running at"), said);
    assertTrue(said.contains("Not looked at: strength"), said);
    assertTrue(Files.readString(into.resolve("speeds.csv")).contains("clear,"));
    assertTrue(Files.size(into.resolve("speeds.pdf")) > 10_000);
    String guessed =
        Files.readString(Path.of("examples/ridge-school.yaml"))
            .replace("  rotor-speed: {lowest: 120 rpm, highest: 400 rpm}\n", "");
    assertEquals(Exit.WRONG_FILE, run("speeds", file(guessed).toString()));
    assertTrue(told().contains("never guessed"), told());
  }

  @Test
  void explainAndSchemaAnswer() {
    assertEquals(0, run("explain", "tension"));
    assertTrue(out.toString(StandardCharsets.UTF_8).contains("How to find it"));
    assertEquals(0, run("explain", "E2"));
    assertEquals(0, run("explain", "guy-slack"));
    assertEquals(Exit.WRONG_COMMAND, run("explain", "nonsense"));
    assertEquals(0, run("schema"));
    assertTrue(out.toString(StandardCharsets.UTF_8).startsWith("{"));
  }

  /** Interrupted, it ends with 130 and leaves no half-written file. */
  @Test
  @EnabledOnOs({OS.LINUX, OS.MAC})
  void interruptEndsWith130() throws IOException, InterruptedException {
    Path into = folder.resolve("stopped");
    Process process =
        new ProcessBuilder(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-XX:TieredStopAtLevel=1",
                "-cp",
                System.getProperty("java.class.path"),
                "org.mastwright.cli.Mastwright",
                "check",
                Path.of("examples/gravel-bench.yaml").toAbsolutePath().toString(),
                "--into",
                into.toString())
            .redirectOutput(ProcessBuilder.Redirect.DISCARD)
            .redirectErrorStream(false)
            .start();
    // a first stage has been told, so the work goes on
    assertTrue(process.getErrorStream().read() > 0);
    new ProcessBuilder("kill", "-INT", Long.toString(process.pid())).start().waitFor();
    assertTrue(process.waitFor(30, TimeUnit.SECONDS));
    assertEquals(Exit.STOPPED, process.exitValue());
    assertFalse(Files.exists(into.resolve("report.pdf")));
  }

  /** Whole runs on mutated files: any exit code of the contract but 70, never a stack trace. */
  @Test
  void mutatedFilesNeverCrashTheWholeRun() throws IOException {
    Random random = new Random(23);
    String[] seeds = {
      Files.readString(Path.of("examples/two-guys.yaml")),
      Files.readString(Path.of("src/test/resources/verification/uneven-anchors.yaml")),
      harbour()
    };
    String alphabet = "019.,:-{}[]# mkNe";
    for (int i = 0; i < 120; i++) {
      StringBuilder text = new StringBuilder(seeds[i % 8 == 7 ? 2 : i % 2]);
      for (int c = 0; c < 2; c++) {
        int at = random.nextInt(text.length());
        text.setCharAt(at, alphabet.charAt(random.nextInt(alphabet.length())));
      }
      int code =
          run("check", file(text.toString()).toString(), "--into", folder.resolve("m").toString());
      assertTrue(List.of(0, 1, 2, 3, 4).contains(code), code + "\n" + told() + "\n" + text);
      assertFalse(told().contains("Exception"), told());
    }
  }
}
