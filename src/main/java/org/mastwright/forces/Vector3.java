package org.mastwright.forces;

/**
 * Three components of one physical vector along east, north, up, in the SI unit its owner names.
 */
public record Vector3(double east, double north, double up) {
  public static final Vector3 ZERO = new Vector3(0, 0, 0);

  /** Sum. */
  public Vector3 plus(Vector3 other) {
    return new Vector3(east + other.east, north + other.north, up + other.up);
  }

  /** Difference. */
  public Vector3 minus(Vector3 other) {
    return new Vector3(east - other.east, north - other.north, up - other.up);
  }

  /** Multiple. */
  public Vector3 times(double factor) {
    return new Vector3(factor * east, factor * north, factor * up);
  }

  /** Vector product, right-handed. */
  public Vector3 cross(Vector3 o) {
    return new Vector3(
        north * o.up - up * o.north, up * o.east - east * o.up, east * o.north - north * o.east);
  }

  /** Scalar product. */
  public double dot(Vector3 o) {
    return east * o.east + north * o.north + up * o.up;
  }

  /** Length, in the unit of the components. */
  public double length() {
    return Math.sqrt(dot(this));
  }

  /** Length of the level part, in the unit of the components. */
  public double level() {
    return Math.hypot(east, north);
  }

  /** The level direction it points to, clockwise from north, 0 to 2π. */
  public double bearing_rad() {
    double b = Math.atan2(east, north);
    return b < 0 ? b + 2 * Math.PI : b;
  }

  /** A level vector of the given length towards a bearing. */
  public static Vector3 towards(double bearing_rad, double length) {
    return new Vector3(length * Math.sin(bearing_rad), length * Math.cos(bearing_rad), 0);
  }
}
