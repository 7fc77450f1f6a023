package org.mastwright.loads;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.mastwright.file.TowerFiles;

/** What the simplified model of IEC 61400-2 is for. */
class GateTest {
  @ParameterizedTest
  @CsvSource({
    "propeller, 3, 4.0 m, 0",
    "multi-blade, 18, 4.0 m, 1",
    "four-sail, 4, 4.0 m, 1",
    "propeller, 1, 4.0 m, 1",
    "propeller, 3, 16.1 m, 1"
  })
  void rotorOutsideTheModelIsAnOpenPoint(String kind, int blades, String diameter, int expected)
      throws IOException {
    String text =
        Files.readString(Path.of("examples/harbour-workshop.yaml"))
            .replace(
                "kind: propeller, blades: 3, diameter: 4.0 m",
                "kind: " + kind + ", blades: " + blades + ", diameter: " + diameter);
    var design =
        TowerFiles.read("t.yaml", text.getBytes(StandardCharsets.UTF_8)).design().orElseThrow();
    long found =
        LoadModel.of(design).findings().stream().filter(f -> f.id().equals("iec-outside")).count();
    assertEquals(expected, found);
  }
}
