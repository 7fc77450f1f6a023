package org.mastwright.file;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.mastwright.design.Tube;

/** Published tables of sections and strand, and recalled grades of steel and rope. */
final class Tables {
  private static final double KSI = 6894757.293168361;

  private Tables() {}

  /** The rows of a table by its column names. */
  static List<Map<String, String>> rows(String name) {
    try (InputStream in = Tables.class.getResourceAsStream("/org/mastwright/tables/" + name)) {
      BufferedReader reader = new BufferedReader(new InputStreamReader(in, StandardCharsets.UTF_8));
      List<Map<String, String>> rows = new ArrayList<>();
      String[] head = null;
      for (String line = reader.readLine(); line != null; line = reader.readLine()) {
        if (!line.startsWith("#") && !line.isBlank()) {
          String[] cells = line.split(",", -1);
          if (head == null) {
            head = cells;
          } else {
            Map<String, String> row = new LinkedHashMap<>();
            for (int i = 0; i < head.length; i++) {
              row.put(head[i], cells[i]);
            }
            rows.add(row);
          }
        }
      }
      return rows;
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** An American pipe by trade size and schedule: STD is 40 to 10 in, XS is 80 to 8 in. */
  static Optional<Map<String, String>> pipe(String nominal, String schedule) {
    String size = nominal.replace(" in", "").replace('-', ' ').replace(" ", "-").trim();
    String weight =
        switch (schedule) {
          case "40", "STD" -> "STD";
          case "80", "XS" -> "XS";
          case "XXS" -> "XXS";
          default -> schedule;
        };
    List<String> names = List.of("Pipe" + size + weight, "Pipe" + decimal(size) + weight);
    return rows("aisc_pipe.csv").stream().filter(r -> names.contains(r.get("name"))).findFirst();
  }

  private static String decimal(String size) {
    return size.replace("-1/2", "-1/2").replace("-1/4", "-1/4");
  }

  /** Outside diameters of pipes by trade size, in inches, to find trade sizes typed as outsides. */
  static Optional<Double> outsideOfTradeSize(double inches) {
    return rows("aisc_pipe.csv").stream()
        .filter(r -> r.get("name").equals("Pipe" + trim(inches) + "STD"))
        .map(r -> Double.parseDouble(r.get("OD")))
        .findFirst();
  }

  private static String trim(double v) {
    return v == Math.rint(v) ? Integer.toString((int) v) : Double.toString(v);
  }

  /** Whether a European table has the size; which one tells how it was made. */
  static Tube.Making making(double outside_mm, double wall_mm) {
    if (inTable("chs_en10210.csv", outside_mm, wall_mm)) {
      return Tube.Making.UNKNOWN;
    }
    return inTable("chs_en10219.csv", outside_mm, wall_mm)
        ? Tube.Making.COLD_FORMED
        : Tube.Making.UNKNOWN;
  }

  private static boolean inTable(String table, double outside_mm, double wall_mm) {
    return rows(table).stream()
        .anyMatch(
            r ->
                Math.abs(Double.parseDouble(r.get("d")) - outside_mm) < 0.05
                    && Math.abs(Double.parseDouble(r.get("t")) - wall_mm) < 0.05);
  }

  /** A grade of steel; values recalled. The wall is for the step at 16 mm. */
  static Optional<Tube.Steel> steel(String name, double wall_m) {
    boolean thick = wall_m > 0.016;
    return switch (name) {
      case "S235" -> steel(name, thick ? 225e6 : 235e6, 360e6, 210e9, false);
      case "S275" -> steel(name, thick ? 265e6 : 275e6, 410e6, 210e9, false);
      case "S355" -> steel(name, thick ? 345e6 : 355e6, 470e6, 210e9, false);
      case "A53-B", "A53 B" -> steel(name, 35 * KSI, 60 * KSI, 29000 * KSI, false);
      case "A500-B", "A500 B" -> steel(name, 42 * KSI, 58 * KSI, 29000 * KSI, false);
      case "A500-C", "A500 C" -> steel(name, 46 * KSI, 62 * KSI, 29000 * KSI, false);
      case "A36" -> steel(name, 36 * KSI, 58 * KSI, 29000 * KSI, false);
      case "A572-50" -> steel(name, 50 * KSI, 65 * KSI, 29000 * KSI, false);
      case "unknown" -> steel(name, 205e6, 330e6, 200e9, true);
      default -> Optional.empty();
    };
  }

  private static Optional<Tube.Steel> steel(
      String name, double fy, double fu, double e, boolean assumed) {
    return Optional.of(
        new Tube.Steel(name, fy, fu, e, e / 2.6, 7850, assumed, "grade table, recalled"));
  }

  /** Aircraft cable 7x19, galvanised: breaking force in lbf by nominal inches; recalled. */
  static Optional<Double> aircraftBreaking_lbf(String nominal) {
    return Optional.ofNullable(
        Map.of(
                "1/8", 2000.0, "5/32", 2800.0, "3/16", 4200.0, "7/32", 5600.0, "1/4", 7000.0,
                "5/16", 9800.0, "3/8", 14400.0)
            .get(nominal));
  }

  /** Metal share of the circle and modulus by construction; recalled. */
  static double[] construction(String kind) {
    return switch (kind) {
      case "1x7" -> new double[] {0.77, 165e9};
      case "1x19" -> new double[] {0.76, 150e9};
      case "7x7" -> new double[] {0.60, 110e9};
      case "7x19" -> new double[] {0.58, 100e9};
      default -> new double[0];
    };
  }
}
