package org.mastwright.file;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Arrays;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.mastwright.working.Finding;

/** The twenty texts E1 to E20: what is said, of which key, on which line. */
class ErrorTextsTest {
  /** One change to a good file and the finding it must give, word by word. */
  record Wrong(String id, String example, String from, String to, String path, String text) {
    @Override
    public String toString() {
      return id + " " + path;
    }
  }

  static Stream<Wrong> twenty() {
    String bench = "gravel-bench";
    String harbour = "harbour-workshop";
    String school = "ridge-school";
    return Stream.of(
        new Wrong(
            "E1",
            bench,
            "speed: 115 mph",
            "speed: 115",
            "site.wind.reference.speed",
            "115 has no unit. Write 115 mph, 51.4 m/s or 185 km/h."),
        new Wrong(
            "E2",
            bench,
            "level: ultimate, ",
            "",
            "site.wind.reference",
            "This speed could be ultimate or nominal; the difference is 40 % of the wind pressure."
                + " Add `level: ultimate` (the map of asce-7-16) or `level: nominal` (older maps,"
                + " 50 years)."),
        new Wrong(
            "E3",
            bench,
            "bearing: 1500 psf",
            "bearing: \"1,500 psf\"",
            "site.soil.bearing",
            "\"1,500 psf\": a comma inside a number is not accepted, because 1,500 is one and a"
                + " half to some readers. Write 1500 psf."),
        new Wrong(
            "E4",
            school,
            "class: III\n",
            "class: III\n    reference: {speed: 24 m/s, averaging: 10 min, level: nominal}\n",
            "site.wind",
            "Both `class: III` (Vref 37.5 m/s) and a reference speed (24 m/s) are given. Keep the"
                + " one that describes your site; the machine's own class goes to"
                + " `turbine.certified-class`."),
        new Wrong(
            "E5",
            bench,
            "diameter: 12 ft",
            "diameter: 12 ft, diametre: 12 ft",
            "turbine.rotor.diametre",
            "is not a known key. Did you mean `diameter`?"),
        new Wrong(
            "E6",
            bench,
            "rotor-speed: 390 rpm",
            "rotor-speed: 24 mph",
            "turbine.rated.rotor-speed",
            "24 mph is a wind speed; here the turning speed is meant, such as 390 rpm. The wind"
                + " goes to `rated.wind`."),
        new Wrong(
            "E7",
            school,
            "held: 90 kN",
            "held: 350 kg",
            "ground.anchors[1].tested.held",
            "350 kg is a mass; a pull is needed. If the scale showed 350 kg, write 350 kgf"
                + " (3.43 kN)."),
        new Wrong(
            "E8",
            bench,
            "pipe: {nominal: 4 in, schedule: 40}",
            "outside: 4 in, wall: 0.237 in",
            "tower.tubes[1].outside",
            "4 in is the trade size of pipe that measures 4.500 in. Write `pipe: {nominal: 4 in,"
                + " schedule: 40}`; or, if you measured 4.00 in across, add `measured: true`."),
        new Wrong(
            "E9",
            bench,
            "schedule: 40}, steel: A53-B",
            "schedule: 40}",
            "tower.tubes[1]",
            "The steel is not given and is not guessed. Look for a stencil on the pipe (A53 B,"
                + " S355). If there is none, write `steel: unknown`; the weakest common pipe is"
                + " then taken."),
        new Wrong(
            "E10",
            bench,
            "{up-the-mast: 53 ft, ",
            "{height: 57 ft, ",
            "tower.guys[3].height",
            "57 ft: the blades sweep down to 56.2 ft here, and the guys would be struck. The top"
                + " guy may be at most 55.2 ft, or the rotor must stand higher."),
        new Wrong(
            "E11",
            bench,
            "{up-the-mast: 53 ft, ",
            "{height: 66 ft, ",
            "tower.guys[3].height",
            "66 ft is above the mast top (60.8 ft: foot 0.75 ft + tubes 60 ft). If 66 ft was"
                + " measured from somewhere else, say `up-the-mast`."),
        new Wrong(
            "E12",
            bench,
            "tension: {sag: 4 in}",
            "tension: 100 lb",
            "tower.guys[3].tension",
            "100 lb: at which end? Add `tension-at: anchor` (where the gauge usually sits) or"
                + " `mast`."),
        new Wrong(
            "E13",
            school,
            "{height: 14.5 m, to: [n, e, s, w], ",
            "{height: 14.5 m, azimuths: [N, E, S, W], radius: 14 m, anchor-level: [0 m, 0 m, 1 m], ",
            "tower.guys[2].anchor-level",
            "has 3 values but there are 4 guys in this set (N, E, S, W). Give one value or four."),
        new Wrong(
            "E14",
            school,
            "{height: 14.5 m, to: [n, e, s, w], ",
            "{height: 14.5 m, azimuths: [N, E, S, W], radius: [46 ft, 14 m, 14 m, 14 m],"
                + " anchor-level: [2 ft, 0 m, 0 m, 0 m], ",
            "tower.guys[2].radius[1]",
            "The guys of sets 1 and 2 to the N end 2.00 ft apart. One anchor or two? If one, give"
                + " both the same radius; pulls are added only then."),
        new Wrong(
            "E15",
            bench,
            "hardware: [{what: turnbuckle, working-load: 2200 lb, safety: 5}]",
            "hardware: [{what: turnbuckle, working-load: 2200 lb}]",
            "tower.guys[1].hardware[1]",
            "A working load of 2200 lb has no `safety`. Write the maker's factor (often 5 for"
                + " forged gear), or the breaking load. Without it the hardware is not assessed."),
        new Wrong(
            "E16",
            harbour,
            "outside: 323.9 mm",
            "outside: 320 mm, shape: polygon-12",
            "tower.tubes[2].outside",
            "A 12-sided tube of 320 mm: across flats or corners? Add `across: flats` or `across:"
                + " corners`."),
        new Wrong(
            "E17",
            harbour,
            "kind: propeller",
            "kind: straight-bladed",
            "turbine.head.hub-above-top",
            "A straight-bladed rotor has no hub height. Write `upright.rotor-bottom-above-top`:"
                + " from the mast top up to the lower end of the blades."),
        new Wrong(
            "E18",
            harbour,
            "  foot-level: 0 m\n",
            "  foot-level: 0 m\n  damping-ratio: 1.2 %\n",
            "tower.damping-ratio",
            "1.20 %: bare welded poles have about 0.2 %. Is it the damping ratio? If 0.012 came"
                + " from a table of logarithmic decrements, write `log-decrement: 0.012`."),
        new Wrong(
            "E19",
            bench,
            "rod-length: 48 in, angle: in-line, torque",
            "rod-length: 48 in, depth: 48 in, angle: in-line, torque",
            "ground.anchors[1].screw.depth",
            "48 in is also the rod length. A rod set in line with a guy at 45 deg goes only 33.9"
                + " in deep. Give `rod-length: 48 in, angle: in-line`, and leave `depth` out."),
        new Wrong(
            "E20",
            bench,
            "kind: guyed-mast",
            "kind: lattice",
            "tower.kind",
            "\"lattice\" cannot be checked here; round and many-sided tubes can: `guyed-mast` or"
                + " `monopole`. Do not describe a lattice as one tube: its local members would go"
                + " unseen."));
  }

  private static final List<String> WARNINGS = List.of("E14", "E15", "E18");

  @ParameterizedTest
  @MethodSource("twenty")
  void mistakeIsToldWordByWord(Wrong w) throws IOException {
    String good = Files.readString(Path.of("examples", w.example() + ".yaml"));
    assertTrue(good.contains(w.from()), w.from());
    int start = good.indexOf(w.from());
    String wrong = good.substring(0, start) + w.to() + good.substring(start + w.from().length());
    if (w.id().equals("E14")) {
      wrong = wrong.replaceFirst("to: \\[n, e, s, w\\]", "azimuths: [N, E, S, W], radius: 14 m");
    }
    Reading reading = TowerFiles.read("t.yaml", wrong.getBytes(StandardCharsets.UTF_8));
    boolean warning = WARNINGS.contains(w.id());
    assertEquals(warning, reading.design().isPresent(), reading.faults().toString());
    Finding found =
        reading.faults().stream()
            .filter(f -> f.id().equals(w.id()) && f.path().equals(w.path()))
            .findFirst()
            .orElseThrow(() -> new AssertionError(reading.faults().toString()));
    assertEquals(w.text(), (found.message() + " " + found.remedy()).strip());
    assertEquals(warning ? Finding.Severity.WARNING : Finding.Severity.ERROR, found.severity());
    // the line is that of the change
    long line = wrong.substring(0, wrong.indexOf(changed(w))).lines().count();
    if (!List.of("E2", "E4", "E9", "E17").contains(w.id())) {
      assertTrue(Math.abs(found.line() - line) <= 1, found.line() + " against " + line);
    }
    assertTrue(found.column() > 0);
    assertTrue(FaultCatalogue.of(w.id()).isPresent(), w.id() + " can be explained");
  }

  private static String changed(Wrong w) {
    return w.to().isEmpty() ? w.from().substring(0, 0) : w.to().strip();
  }

  @Test
  void allFaultsComeInOneRun() throws IOException {
    String text =
        Files.readString(Path.of("examples/gravel-bench.yaml"))
            .replace("speed: 115 mph", "speed: 115")
            .replace("diameter: 12 ft", "diameter: 12 ft, colour: red")
            .replace("kind: guyed-mast", "kind: lattice")
            .replace("held: 4000 lb", "held: 350 kg");
    List<String> ids =
        TowerFiles.read("t.yaml", text.getBytes(StandardCharsets.UTF_8)).faults().stream()
            .map(Finding::id)
            .toList();
    assertTrue(ids.containsAll(Arrays.asList("E1", "E5", "E7", "E20")), ids.toString());
  }
}
