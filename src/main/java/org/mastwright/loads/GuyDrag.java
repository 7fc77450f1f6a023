package org.mastwright.loads;

import java.util.List;
import org.mastwright.forces.Vector3;
import org.mastwright.units.Unit;
import org.mastwright.working.Clause;
import org.mastwright.working.Formula;
import org.mastwright.working.Formula.Var;
import org.mastwright.working.Status;

/** Wind on a guy: square to it, by the part of the wind that is square to it. */
public final class GuyDrag {
  private static final double AIR_VISCOSITY = 15e-6;

  public static final Formula PER_LENGTH =
      new Formula(
          "w",
          Unit.NPM,
          "{q}·{c_d}·{d}·sin({ψ})²",
          new Clause("EN 1993-3-1", "2006", "B.2.1.4", Status.RECALLED),
          List.of(
              new Var("q", Unit.PA),
              new Var("c_d", Unit.ONE),
              new Var("d", Unit.MM),
              new Var("ψ", Unit.DEG)),
          v -> perLength_Npm(v[0], v[1], v[2], v[3]));

  private GuyDrag() {}

  /** {@code q cd d sin²ψ}, ψ between wind and guy. */
  public static double perLength_Npm(
      double pressure_Pa, double cd, double diameter_m, double angle_rad) {
    double s = Math.sin(angle_rad);
    return pressure_Pa * cd * diameter_m * s * s;
  }

  /** 1.2 below a Reynolds number of 6·10⁴, 0.9 above 10⁵, a line between. */
  public static double cd(double speed_mps, double diameter_m) {
    double reynolds = speed_mps * diameter_m / AIR_VISCOSITY;
    return reynolds <= 6e4 ? 1.2 : reynolds >= 1e5 ? 0.9 : 1.2 - 0.3 * (reynolds - 6e4) / 4e4;
  }

  /** Load per length on a guy along the unit vector {@code along} in a level wind. */
  static Vector3 load_Npm(
      double density_kgpm3, Vector3 wind_mps, double diameter_m, Vector3 along) {
    double speed = wind_mps.length();
    Vector3 across = wind_mps.minus(along.times(wind_mps.dot(along)));
    double size = across.length();
    return across.times(0.5 * density_kgpm3 * cd(speed, diameter_m) * diameter_m * size);
  }
}
