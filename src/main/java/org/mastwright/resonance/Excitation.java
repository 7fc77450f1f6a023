package org.mastwright.resonance;

import java.util.ArrayList;
import java.util.List;
import org.mastwright.design.Rotor;

/**
 * Something that happens {@code order} times in a turn of the rotor.
 *
 * @param name in words
 * @param judged whether dwelling in its window fails; otherwise the window is only shown
 */
public record Excitation(int order, String name, boolean judged) {

  /**
   * The excitations of a rotor: once per turn (imbalance), each blade passing, twice that (shown
   * only), twice per turn of a two-blade rotor (gyroscopic), and what the user adds.
   */
  public static List<Excitation> of(Rotor rotor, List<Integer> extraOrders) {
    List<Excitation> all = new ArrayList<>();
    all.add(new Excitation(1, "once per turn", true));
    if (rotor.blades() > 1) {
      all.add(new Excitation(rotor.blades(), "each blade passing", true));
      all.add(new Excitation(2 * rotor.blades(), "twice per blade passing", false));
    }
    for (int order : extraOrders) {
      all.removeIf(e -> e.order() == order && !e.judged());
      if (all.stream().noneMatch(e -> e.order() == order)) {
        all.add(new Excitation(order, order + " times per turn, as given", true));
      }
    }
    all.sort(java.util.Comparator.comparingInt(Excitation::order));
    return List.copyOf(all);
  }
}
