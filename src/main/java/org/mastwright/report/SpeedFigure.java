package org.mastwright.report;

import java.util.Comparator;
import java.util.List;
import java.util.stream.Collectors;
import org.mastwright.assess.SpeedResult;
import org.mastwright.units.Numbers;
import org.mastwright.units.Unit;

/** Natural frequencies against rotor speed: where a line meets a band, the tower is shaken. */
final class SpeedFigure {
  private static final double WIDTH = 136;
  private static final double HEIGHT = 104;
  private static final double LEFT = 14;
  private static final double RIGHT = 122;
  private static final double TOP = 6;
  private static final double FOOT = 88;
  private static final double LABEL_ROOM = 2.5;
  private static final Svg.Stroke HATCH = new Svg.Stroke("#c98a63", 0.12, "");

  private SpeedFigure() {}

  static Figure of(SpeedResult s, Print print) {
    Svg svg = new Svg(WIDTH, HEIGHT);
    double fastest = Unit.RPM.fromSi(s.highest_radps()) * 1.05;
    Scale x = Scale.fromZero(fastest, LEFT, RIGHT, 8);
    double highest =
        s.lines().stream().mapToDouble(SpeedResult.FrequencyBand::greatest_Hz).max().orElse(1);
    int least = s.orders().isEmpty() ? 1 : s.orders().get(0);
    double shown = highest * 1.1 > least * fastest / 60 ? highest * 1.1 : least * fastest / 60;
    Scale y = Scale.fromZero(shown, FOOT, TOP, 8);
    windows(svg, s, x);
    Axes.side(svg, y, LEFT, RIGHT, 8, "frequency, Hz");
    Axes.foot(svg, x, TOP, FOOT, 8, "rotor speed, rpm");
    s.lines().forEach(b -> band(svg, b, y));
    labels(svg, s.lines(), y);
    s.orders().forEach(k -> order(svg, k, x, y));
    range(svg, s, x);
    String caption = caption(s);
    return new Figure(svg.end("Frequency over rotor speed. " + caption), caption);
  }

  private static void windows(Svg svg, SpeedResult s, Scale x) {
    for (SpeedResult.Window w : s.windowsToAvoid()) {
      double from = x.at(Unit.RPM.fromSi(w.from_radps()));
      double to = x.at(Unit.RPM.fromSi(w.to_radps()));
      svg.rect(from, TOP, to - from, FOOT - TOP, HATCH, "#faf3ee");
      svg.hatch(from, TOP, to - from, FOOT - TOP, 2.2, HATCH);
    }
  }

  private static void band(Svg svg, SpeedResult.FrequencyBand band, Scale y) {
    double least = y.at(band.least_Hz());
    double most = y.at(band.greatest_Hz());
    Svg.Stroke stroke = band.blocks() ? Svg.INK : Svg.HAIR.dashed("1 0.8");
    svg.rect(LEFT, most, RIGHT - LEFT, least - most, new Svg.Stroke("none", 0, ""), "#d9e4ee");
    svg.line(LEFT, least, RIGHT, least, stroke);
    svg.line(LEFT, most, RIGHT, most, stroke);
  }

  /** Mode numbers beside their bands, moved apart where the bands lie close. */
  private static void labels(Svg svg, List<SpeedResult.FrequencyBand> bands, Scale y) {
    List<SpeedResult.FrequencyBand> upwards =
        bands.stream()
            .sorted(
                Comparator.comparingDouble(SpeedResult.FrequencyBand::least_Hz)
                    .thenComparingDouble(SpeedResult.FrequencyBand::greatest_Hz))
            .toList();
    double last = FOOT + LABEL_ROOM;
    for (SpeedResult.FrequencyBand band : upwards) {
      double middle = (y.at(band.least_Hz()) + y.at(band.greatest_Hz())) / 2;
      double at = middle > last - LABEL_ROOM ? last - LABEL_ROOM : middle;
      svg.line(RIGHT, middle, RIGHT + 2, at, Svg.HAIR);
      svg.text(RIGHT + 2.4, at + 0.7, 2.1, "mode " + band.mode());
      last = at;
    }
  }

  private static void order(Svg svg, int order, Scale x, Scale y) {
    double atEnd = order * x.to() / 60;
    boolean leavesAbove = atEnd > y.to();
    double rpm = leavesAbove ? y.to() * 60 / order : x.to();
    double frequency = leavesAbove ? y.to() : atEnd;
    svg.line(x.at(0), y.at(0), x.at(rpm), y.at(frequency), Svg.RUST);
    double px = x.at(rpm);
    double py = y.at(frequency);
    if (leavesAbove) {
      svg.textMiddle(px, py - 1.2, 2.5, order + "P");
    } else {
      svg.textEnd(px - 1, py - 1.4, 2.5, order + "P");
    }
  }

  private static void range(Svg svg, SpeedResult s, Scale x) {
    double y = FOOT + 11;
    bar(svg, x, s.lowest_radps(), s.highest_radps(), y, Svg.HAIR);
    for (SpeedResult.Range r : s.clear()) {
      bar(svg, x, r.from_radps(), r.to_radps(), y, Svg.GREEN.dashed("").thick(1.2));
      double middle =
          (x.at(Unit.RPM.fromSi(r.from_radps())) + x.at(Unit.RPM.fromSi(r.to_radps()))) / 2;
      svg.textMiddle(middle, y + 3.6, 2.3, "clear");
    }
    for (double end : List.of(s.lowest_radps(), s.highest_radps())) {
      double at = x.at(Unit.RPM.fromSi(end));
      svg.line(at, TOP, at, y + 1, Svg.INK.dashed("2 1"));
    }
  }

  private static void bar(Svg svg, Scale x, double from, double to, double y, Svg.Stroke stroke) {
    svg.line(x.at(Unit.RPM.fromSi(from)), y, x.at(Unit.RPM.fromSi(to)), y, stroke);
  }

  private static String caption(SpeedResult s) {
    String orders = s.orders().stream().map(k -> k + "P").collect(Collectors.joining(", "));
    String windows =
        s.windowsToAvoid().stream()
            .map(w -> rpm(w.from_radps()) + " to " + rpm(w.to_radps()) + " rpm")
            .collect(Collectors.joining(", "));
    String clear =
        s.clear().stream()
            .map(r -> rpm(r.from_radps()) + " to " + rpm(r.to_radps()) + " rpm")
            .collect(Collectors.joining(", "));
    return "Slanting lines: the excitations "
        + orders
        + " times per turn. Level bands: natural frequencies over all states considered. Hatched:"
        + " speeds to avoid, "
        + (windows.isEmpty() ? "none" : windows)
        + ". Clear: "
        + (clear.isEmpty() ? "none" : clear)
        + ". Upright broken lines: the range "
        + rpm(s.lowest_radps())
        + " to "
        + rpm(s.highest_radps())
        + " rpm.";
  }

  private static String rpm(double speed_radps) {
    return Numbers.fixed(Unit.RPM.fromSi(speed_radps), 0);
  }
}
