package org.mastwright.frame;

import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleFunction;

/** Upright chains for tests. */
final class Chains {
  private Chains() {}

  static Chain column(
      double length_m, int beams, DoubleFunction<Chain.Beam> section, Chain.Base base) {
    return column(length_m, beams, section, base, 0);
  }

  /** Straight up, equal beams; {@code section} by the share of the height at a beam's middle. */
  static Chain column(
      double length_m,
      int beams,
      DoubleFunction<Chain.Beam> section,
      Chain.Base base,
      double gravity) {
    List<Chain.Point> nodes = new ArrayList<>();
    List<Chain.Beam> all = new ArrayList<>();
    for (int i = 0; i <= beams; i++) {
      nodes.add(new Chain.Point(0, 0, length_m * i / beams));
    }
    for (int i = 0; i < beams; i++) {
      all.add(section.apply((i + 0.5) / beams));
    }
    return new Chain(nodes, all, List.of(), List.of(), base, gravity);
  }

  /** Slender: no shear, no rotary inertia, hardly any stretch. */
  static Chain.Beam slender(double bending_Nm2, double mass_kgpm) {
    return new Chain.Beam(
        bending_Nm2 * 1e6,
        bending_Nm2,
        bending_Nm2,
        Double.POSITIVE_INFINITY,
        mass_kgpm,
        0,
        mass_kgpm * 1e-4);
  }

  static ChainLoad force(int node, double x, double y, double z) {
    return force(node, new Chain.Point(0, 0, 0), x, y, z);
  }

  static ChainLoad force(int node, Chain.Point offset, double x, double y, double z) {
    return ChainLoad.weightOnly()
        .withVariable(
            new ChainLoad.Part(
                List.of(
                    new ChainLoad.NodeLoad(
                        node,
                        offset,
                        new ChainLoad.Components(x, y, z),
                        new ChainLoad.Components(0, 0, 0))),
                List.of(),
                List.of()));
  }
}
