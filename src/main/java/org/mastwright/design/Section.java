package org.mastwright.design;

/**
 * A round tube or a regular polygon, by its design wall.
 *
 * @param outside_m outside diameter; of a polygon across its flats
 * @param wall_m design wall
 * @param sides 0 for round, else 8, 12, 16 or 18
 */
public record Section(double outside_m, double wall_m, int sides) {
  public Section {
    if (!(wall_m > 0) || !(outside_m >= 2 * wall_m) || sides < 0 || sides == 1 || sides == 2) {
      throw new IllegalArgumentException(
          "section: outside " + outside_m + " m, wall " + wall_m + " m, sides " + sides);
    }
  }

  public boolean isRound() {
    return sides == 0;
  }

  public double inside_m() {
    return outside_m - 2 * wall_m;
  }

  /** Area of steel. A polygon: difference of two regular polygons about the same centre. */
  public double area_m2() {
    double d = outside_m;
    double i = inside_m();
    return areaCoefficient() * (d * d - i * i);
  }

  /** Second moment of area about any axis through the centre. */
  public double secondMoment_m4() {
    double d = outside_m;
    double i = inside_m();
    return secondMomentCoefficient() * (d * d * d * d - i * i * i * i);
  }

  /**
   * Torsion constant: exact for a round tube; Bredt's thin-wall value of the middle line for a
   * polygon.
   */
  public double torsionConstant_m4() {
    if (isRound()) {
      return 2 * secondMoment_m4();
    }
    double middle = outside_m - wall_m;
    double enclosed = areaCoefficient() * middle * middle;
    double perimeter = sides * middle * Math.tan(Math.PI / sides);
    return 4 * enclosed * enclosed * wall_m / perimeter;
  }

  /** Elastic section modulus; of a polygon to its corner, the lesser. */
  public double elasticModulus_m3() {
    return secondMoment_m4() / (greatestAcross_m() / 2);
  }

  /** Plastic section modulus, exact; of a polygon about the axis through two corners. */
  public double plasticModulus_m3() {
    double d = outside_m;
    double i = inside_m();
    if (isRound()) {
      return (d * d * d - i * i * i) / 6;
    }
    return polygonPlasticCoefficient() * (d * d * d - i * i * i);
  }

  public double radiusOfGyration_m() {
    return Math.sqrt(secondMoment_m4() / area_m2());
  }

  /** Across the corners of a polygon; the diameter of a round tube. */
  public double greatestAcross_m() {
    return isRound() ? outside_m : outside_m / Math.cos(Math.PI / sides);
  }

  /** Outside surface per length: perimeter. */
  public double perimeter_m() {
    return isRound() ? Math.PI * outside_m : sides * outside_m * Math.tan(Math.PI / sides);
  }

  /** Area of a regular polygon over the square of its width across flats; π/4 for a circle. */
  private double areaCoefficient() {
    return isRound() ? Math.PI / 4 : sides * Math.tan(Math.PI / sides) / 4;
  }

  /** Second moment of a regular polygon over the fourth power of its width across flats. */
  private double secondMomentCoefficient() {
    if (isRound()) {
      return Math.PI / 64;
    }
    double t = Math.tan(Math.PI / sides);
    return sides * t * (3 + t * t) / 192;
  }

  /**
   * First moment of half a regular polygon, twice, over the cube of its width across flats, about
   * the axis through two opposite corners (the lesser for a closed thin wall).
   */
  private double polygonPlasticCoefficient() {
    double corner = 0.5 / Math.cos(Math.PI / sides);
    double sum = 0;
    for (int k = 0; k < sides / 2; k++) {
      double a = 2 * Math.PI * k / sides;
      double b = 2 * Math.PI * (k + 1) / sides;
      double ax = corner * Math.cos(a);
      double ay = corner * Math.sin(a);
      double bx = corner * Math.cos(b);
      double by = corner * Math.sin(b);
      sum += (ax * by - bx * ay) * (ay + by) / 6;
    }
    return 2 * sum;
  }
}
