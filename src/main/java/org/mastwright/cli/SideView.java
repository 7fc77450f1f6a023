package org.mastwright.cli;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.mastwright.design.Design;
import org.mastwright.design.Ground;
import org.mastwright.design.GuySet;
import org.mastwright.design.Rotor;
import org.mastwright.design.Tower;
import org.mastwright.units.Unit;
import org.mastwright.units.UnitSystem;

/** The tower from the side in characters: enough to see a level at the wrong height. */
final class SideView {
  private static final int ROWS = 22;
  private static final int COLUMNS = 45;
  private static final int MIDDLE = COLUMNS / 2;

  private final Design design;
  private final UnitSystem units;

  /** What stands beside a height. */
  private record Named(double height_m, String words) {}

  private final List<Named> named = new ArrayList<>();
  private final char[][] cells = new char[ROWS + 1][COLUMNS];
  private final String[] labels = new String[ROWS + 1];
  private final double bottom_m;
  private final double perRow_m;
  private final double perColumn_m;
  private final double seen_rad;

  private SideView(Design design) {
    this.design = design;
    this.units = design.project().units();
    for (char[] row : cells) {
      java.util.Arrays.fill(row, ' ');
    }
    java.util.Arrays.fill(labels, "");
    Tower t = design.tower();
    List<Ground.Anchor> anchors = design.ground().anchors();
    double low = Math.min(0, anchors.stream().mapToDouble(Ground.Anchor::up_m).min().orElse(0));
    double high = t.topHeight_m();
    double wide = 0.3 * high;
    if (design.turbine().isPresent()) {
      Rotor r = design.turbine().get().rotor();
      high += design.turbine().get().head().hubAboveTop_m() + r.radius_m();
    }
    for (Ground.Anchor a : anchors) {
      wide = Math.max(wide, a.out_m());
    }
    bottom_m = low;
    perRow_m = (high - low) / (ROWS - 1);
    perColumn_m = wide / (MIDDLE - 2);
    seen_rad = t.guys().isEmpty() ? 0 : t.guys().get(0).guys().get(0).azimuth_rad();
  }

  static List<String> of(Design design) {
    SideView v = new SideView(design);
    v.ground();
    v.guys();
    v.mast();
    v.rotor();
    v.write();
    List<String> out = new ArrayList<>();
    for (int row = 0; row <= ROWS; row++) {
      String line = "  " + new String(v.cells[row]) + "  " + v.labels[row];
      out.add(line.stripTrailing());
    }
    while (!out.isEmpty() && out.get(out.size() - 1).isBlank()) {
      out.remove(out.size() - 1);
    }
    return out;
  }

  private int row(double height_m) {
    int r = (int) Math.round(ROWS - 1 - (height_m - bottom_m) / perRow_m);
    return Math.max(0, Math.min(ROWS, r));
  }

  private int column(double out_m) {
    return Math.max(0, Math.min(COLUMNS - 1, (int) Math.round(MIDDLE + out_m / perColumn_m)));
  }

  private void put(int row, int column, char sign) {
    cells[row][column] = sign;
  }

  private void label(double height_m, String what) {
    named.add(new Named(height_m, units.print(height_m, Unit.M) + " " + what));
  }

  /** The highest first, each at its row or the next free one below. */
  private void write() {
    named.sort(Comparator.comparingDouble(Named::height_m).reversed());
    int free = 0;
    for (Named n : named) {
      free = Math.max(free, row(n.height_m()));
      if (free > ROWS) {
        free = ROWS;
        labels[free] += ";";
      }
      labels[free] = (labels[free] + " " + n.words()).strip();
      free++;
    }
  }

  private void ground() {
    int r = row(0);
    for (int c = 0; c < COLUMNS; c++) {
      put(r, c, '.');
    }
    label(0, "ground");
  }

  private void mast() {
    Tower t = design.tower();
    for (int r = row(t.topHeight_m()); r <= row(t.footLevel_m()); r++) {
      put(r, MIDDLE, '|');
    }
    put(row(t.footLevel_m()), MIDDLE, '^');
    label(t.topHeight_m(), "mast top");
  }

  /** Guys as seen square to the first one; those that point at the reader are left out. */
  private void guys() {
    Tower t = design.tower();
    List<Ground.Anchor> anchors = design.ground().anchors();
    for (GuySet set : t.guys()) {
      double height = t.footLevel_m() + set.along_m();
      for (GuySet.Guy g : set.guys()) {
        Ground.Anchor a = anchors.get(g.anchor());
        double out = a.out_m() * Math.cos(g.azimuth_rad() - seen_rad);
        if (Math.abs(out) > 0.3 * a.out_m()) {
          line(row(height), MIDDLE, row(a.up_m()), column(out), out > 0 ? '\\' : '/');
          put(row(a.up_m()), column(out), '#');
        }
      }
      label(height, "guys, level " + set.number());
    }
  }

  private void line(int r0, int c0, int r1, int c1, char sign) {
    int steps = Math.max(Math.abs(r1 - r0), Math.abs(c1 - c0));
    for (int i = 1; i < steps; i++) {
      int r = (int) Math.round(r0 + (r1 - r0) * (double) i / steps);
      int c = (int) Math.round(c0 + (c1 - c0) * (double) i / steps);
      put(r, c, sign);
    }
  }

  private void rotor() {
    if (design.turbine().isEmpty() || design.turbine().get().rotor().kind().isUpright()) {
      return;
    }
    Rotor rotor = design.turbine().get().rotor();
    double hub = design.tower().topHeight_m() + design.turbine().get().head().hubAboveTop_m();
    for (int r = row(hub + rotor.radius_m()); r <= row(hub - rotor.radius_m()); r++) {
      put(r, MIDDLE - 1, ':');
    }
    put(row(hub), MIDDLE - 1, 'o');
    put(row(hub), MIDDLE, '-');
    label(hub, "hub");
    label(hub + rotor.radius_m(), "highest blade");
    label(hub - rotor.radius_m(), "lowest blade");
  }
}
