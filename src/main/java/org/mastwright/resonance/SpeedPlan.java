package org.mastwright.resonance;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.mastwright.design.Turbine.Band;

/**
 * Which rotor speeds to avoid and which are clear.
 *
 * @param lowest_radps of the range the rotor runs in
 * @param avoid windows of judged excitations within the range, sorted
 * @param watch windows of the others within the range, sorted
 * @param clear ranges outside all windows to avoid, wide enough to use
 * @param tooNarrow ranges outside all windows that are too narrow to run in
 */
public record SpeedPlan(
    double lowest_radps,
    double highest_radps,
    List<SpeedWindow> avoid,
    List<SpeedWindow> watch,
    List<Band> clear,
    List<Band> tooNarrow) {

  /** A clear range narrower than this share of its upper end cannot be kept by any control [P]. */
  static final double LEAST_WIDTH_RATIO = 0.10;

  public SpeedPlan {
    avoid = List.copyOf(avoid);
    watch = List.copyOf(watch);
    clear = List.copyOf(clear);
    tooNarrow = List.copyOf(tooNarrow);
  }

  /**
   * @param marginRatio distance kept from each end of a mode's band
   * @param uprightRotor whether twisting modes count
   */
  public static SpeedPlan of(
      List<ModeBand> modes,
      List<Excitation> excitations,
      double marginRatio,
      double lowest_radps,
      double highest_radps,
      boolean uprightRotor) {
    List<SpeedWindow> avoid = new ArrayList<>();
    List<SpeedWindow> watch = new ArrayList<>();
    for (ModeBand mode : modes) {
      for (Excitation excitation : excitations) {
        SpeedWindow window = SpeedWindow.of(mode, excitation, marginRatio);
        if (mode.blocks(uprightRotor) && window.overlaps(lowest_radps, highest_radps)) {
          (excitation.judged() ? avoid : watch).add(window);
        }
      }
    }
    Comparator<SpeedWindow> bySpeed =
        Comparator.comparingDouble(SpeedWindow::from_radps)
            .thenComparingDouble(SpeedWindow::to_radps);
    avoid.sort(bySpeed);
    watch.sort(bySpeed);
    List<Band> gaps = gaps(avoid, lowest_radps, highest_radps);
    return new SpeedPlan(
        lowest_radps,
        highest_radps,
        avoid,
        watch,
        gaps.stream().filter(SpeedPlan::wideEnough).toList(),
        gaps.stream().filter(g -> !wideEnough(g)).toList());
  }

  private static boolean wideEnough(Band gap) {
    return gap.to_radps() - gap.from_radps() >= LEAST_WIDTH_RATIO * gap.to_radps();
  }

  private static List<Band> gaps(List<SpeedWindow> sorted, double lowest, double highest) {
    List<Band> gaps = new ArrayList<>();
    double from = lowest;
    for (SpeedWindow window : sorted) {
      if (window.from_radps() > from) {
        gaps.add(new Band(from, Math.min(window.from_radps(), highest)));
      }
      from = Math.max(from, window.to_radps());
    }
    if (from < highest) {
      gaps.add(new Band(from, highest));
    }
    return gaps;
  }

  /** The windows to avoid joined where they touch, cut to the range, as (from, to). */
  public List<Band> merged() {
    List<Band> merged = new ArrayList<>();
    for (SpeedWindow w : avoid) {
      double from = Math.max(w.from_radps(), lowest_radps);
      double to = Math.min(w.to_radps(), highest_radps);
      Band last = merged.isEmpty() ? null : merged.get(merged.size() - 1);
      if (last != null && from <= last.to_radps()) {
        merged.set(merged.size() - 1, new Band(last.from_radps(), Math.max(last.to_radps(), to)));
      } else {
        merged.add(new Band(from, to));
      }
    }
    return List.copyOf(merged);
  }
}
