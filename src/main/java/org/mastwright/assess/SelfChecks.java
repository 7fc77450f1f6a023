package org.mastwright.assess;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.mastwright.design.Design;
import org.mastwright.forces.LimitState;
import org.mastwright.forces.SectionForces;
import org.mastwright.forces.Vector3;

/** Equilibrium of every case, and two second methods. */
final class SelfChecks {
  private SelfChecks() {}

  static SelfCheck of(Design design, List<SolvedCase> cases, Speeds speeds) {
    List<SolvedCase> whole = cases.stream().filter(c -> c.response().converged()).toList();
    double imbalance = 0;
    double residual = 0;
    for (SolvedCase c : whole) {
      imbalance = Math.max(imbalance, Statics.of(design, c).forceImbalanceRatio());
      residual = Math.max(residual, c.response().residual());
    }
    List<SelfCheck.Row> rows = new ArrayList<>();
    double apart = 0;
    Optional<SolvedCase> worst =
        whole.stream()
            .filter(c -> c.response().mark().limitState() == LimitState.STRENGTH)
            .max(Comparator.comparingDouble(c -> c.response().greatestMoment().moment_Nm()));
    if (worst.isPresent()) {
      Statics statics = Statics.of(design, worst.get());
      SectionForces s = worst.get().response().greatestMoment();
      double byStatics = statics.momentAt_Nm(s);
      apart = Math.abs(byStatics / s.moment_Nm() - 1);
      String id = worst.get().response().mark().id();
      rows.add(
          new SelfCheck.Row(
              "greatest bending moment, " + id,
              "beams",
              s.moment_Nm(),
              "moments of all above on the deformed shape",
              byStatics,
              "N·m"));
      double atFoot = statics.momentAt_Nm(worst.get().response().stations().get(0));
      double base = worst.get().response().base().moment_Nm();
      apart = Math.max(apart, Math.abs(atFoot - base) / s.moment_Nm());
      rows.add(
          new SelfCheck.Row(
              "moment at the foot, " + id,
              "reaction of the foot",
              base,
              "moments of all above on the deformed shape",
              atFoot,
              "N·m"));
      Vector3 applied = statics.applied_N();
      Vector3 held = statics.reactions_N();
      rows.add(
          new SelfCheck.Row(
              "level force, " + id,
              "wind, summed",
              applied.level(),
              "foot and anchors",
              held.level(),
              "N"));
      rows.add(
          new SelfCheck.Row(
              "vertical force, " + id,
              "weights, summed",
              -applied.up(),
              "foot and anchors",
              held.up(),
              "N"));
    }
    rows.add(
        new SelfCheck.Row(
            "first frequency",
            "subspace iteration",
            speeds.first_Hz(),
            "Rayleigh's quotient of the shape under a level push at the top (never lower)",
            speeds.rayleigh_Hz(),
            "Hz"));
    return new SelfCheck(imbalance, residual, speeds.complete(), apart, rows);
  }
}
