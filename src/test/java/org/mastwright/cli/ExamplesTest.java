package org.mastwright.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Every example ends as its first line says, and the program as its commands say. */
class ExamplesTest {
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

  private static int expected(Path example) throws IOException {
    String first = Files.readAllLines(example).get(0);
    assertTrue(first.startsWith("# Expected exit code: "), first);
    return first.charAt("# Expected exit code: ".length()) - '0';
  }

  @ParameterizedTest
  @ValueSource(strings = {"gravel-bench", "harbour-workshop", "ridge-school"})
  void exampleEndsAsItSays(String name) throws IOException {
    Path example = Path.of("examples", name + ".yaml");
    int code = run("check", example.toString(), "--into", folder.resolve("a").toString());
    String said = out.toString(StandardCharsets.UTF_8);
    assertEquals(expected(example), code, err.toString(StandardCharsets.UTF_8));
    assertTrue(said.contains("A calculation, not an approval"));
    for (String line : said.split("\n")) {
      assertTrue(line.length() <= 80, line);
    }
    for (String file : List.of("report.pdf", "results.json", "tower-file.yaml")) {
      assertTrue(Files.size(folder.resolve("a").resolve(file)) > 1000, file);
    }
    String results = Files.readString(folder.resolve("a/results.json"));
    java.util.regex.Matcher ids =
        java.util.regex.Pattern.compile(
                "\"id\" : \"([a-z0-9-]+)\",\\s+\"title\" : \"[^\"]*\",\\s+\"clause\"")
            .matcher(results);
    int found = 0;
    while (ids.find()) {
      found++;
      assertEquals(0, run("explain", ids.group(1)), ids.group(1));
    }
    assertTrue(found >= 10, "checks " + found);
    reportHoldsEveryCheckAndTheCautions(results);
    assertTrue(Files.readString(Path.of("README.md")).contains("| `" + name + ".yaml` | " + code));
  }

  private void reportHoldsEveryCheckAndTheCautions(String results) throws IOException {
    try (PDDocument pdf = Loader.loadPDF(folder.resolve("a/report.pdf").toFile())) {
      assertTrue(pdf.getNumberOfPages() >= 12, "pages " + pdf.getNumberOfPages());
      PDFTextStripper reader = new PDFTextStripper();
      // soft hyphens let long words break; they are no letters
      String all = reader.getText(pdf).replaceAll("[\u00ad\\s-]", "");
      java.util.regex.Matcher ids =
          java.util.regex.Pattern.compile(
                  "\"id\" : \"([a-z0-9-]+)\",\\s+\"title\" : \"[^\"]*\",\\s+\"clause\"")
              .matcher(results);
      while (ids.find()) {
        assertTrue(all.contains(ids.group(1).replace("-", "")), ids.group(1));
      }
      reader.setEndPage(1);
      String first = reader.getText(pdf).replaceAll("\\s+", " ");
      assertTrue(first.contains("A calculation, not an approval"), first);
      assertTrue(first.contains("licensed engineer"), first);
      assertFalse(first.toLowerCase(java.util.Locale.ROOT).contains(" safe"), first);
    }
  }

  @Test
  void twoRunsGiveTheSameBytes() throws IOException {
    String example = "examples/harbour-workshop.yaml";
    run("check", example, "--into", folder.resolve("a").toString());
    run("check", example, "--into", folder.resolve("b").toString());
    for (String file : List.of("report.pdf", "results.json", "tower-file.yaml")) {
      assertEquals(
          -1, Files.mismatch(folder.resolve("a").resolve(file), folder.resolve("b").resolve(file)));
    }
  }

  @Test
  void verificationFilesGiveAShortTable() throws IOException {
    Path example = Path.of("examples/two-guys.yaml");
    int code = run("check", example.toString(), "--into", folder.resolve("v").toString());
    assertEquals(expected(example), code);
    assertFalse(Files.exists(folder.resolve("v/report.pdf")));
    assertTrue(Files.readString(folder.resolve("v/results.json")).contains("\"verification\""));
  }

  @Test
  void wrongFileIsToldWholeAndNothingIsTouched() throws IOException {
    Path wrong = folder.resolve("wrong.yaml");
    Files.writeString(
        wrong,
        Files.readString(Path.of("examples/harbour-workshop.yaml"))
            .replace("diameter: 4.0 m", "diametre: 4.0 m")
            .replace("speed: 24 m/s", "speed: 24")
            .replace("kind: monopole", "kind: lattice"));
    Path into = folder.resolve("never");
    int code = run("check", wrong.toString(), "--into", into.toString());
    assertEquals(Exit.WRONG_FILE, code);
    String told = err.toString(StandardCharsets.UTF_8);
    assertTrue(told.contains("Did you mean `diameter`?"), told);
    assertTrue(told.contains("has no unit"), told);
    assertTrue(told.contains("\"lattice\" cannot be checked here"), told);
    assertFalse(Files.exists(into));
  }

  @Test
  void foldersOfOthersAreLeftAlone() throws IOException {
    Path foreign = Files.createDirectory(folder.resolve("foreign"));
    Files.writeString(foreign.resolve("letter.txt"), "mine");
    int code = run("check", "examples/two-guys.yaml", "--into", foreign.toString());
    assertEquals(Exit.NOT_WRITTEN, code);
    try (var list = Files.list(foreign)) {
      assertEquals(1, list.count());
    }
  }

  @Test
  void commandLineMistakesEndWith64() {
    assertEquals(Exit.WRONG_COMMAND, run("chekc", "x"));
    assertEquals(Exit.WRONG_COMMAND, run("check"));
    assertEquals(Exit.WRONG_COMMAND, run("raise", "x"));
    assertEquals(Exit.WRONG_COMMAND, run());
    assertEquals(Exit.WRONG_FILE, run("check", folder.resolve("none.yaml").toString()));
    assertEquals(0, run("--version"));
    assertEquals(0, run("--help"));
    String help = out.toString(StandardCharsets.UTF_8);
    assertFalse(help.contains("raise"), help);
  }

  @Test
  void plainOutputIsAsciiOnly() {
    run(
        "check",
        "examples/harbour-workshop.yaml",
        "--plain",
        "--into",
        folder.resolve("p").toString());
    assertTrue(out.toString(StandardCharsets.UTF_8).chars().allMatch(c -> c < 128));
  }

  /** Two routes to the same moments, in the file that others read. */
  @ParameterizedTest
  @ValueSource(strings = {"gravel-bench", "harbour-workshop", "ridge-school"})
  void secondMethodAgrees(String name) throws IOException {
    run("check", "examples/" + name + ".yaml", "--into", folder.resolve("s").toString());
    java.util.regex.Matcher second =
        java.util.regex.Pattern.compile("\"second_method\" : ([0-9.eE-]+)")
            .matcher(Files.readString(folder.resolve("s/results.json")));
    assertTrue(second.find());
    assertTrue(Double.parseDouble(second.group(1)) < 0.02, second.group(1));
  }
}
