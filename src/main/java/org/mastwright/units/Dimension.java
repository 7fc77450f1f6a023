package org.mastwright.units;

/** What a dimensional value measures. Two values can be compared only within one dimension. */
public enum Dimension {
  ONE,
  LENGTH,
  AREA,
  VOLUME,
  SECOND_MOMENT,
  MASS,
  MASS_PER_LENGTH,
  DENSITY,
  WEIGHT_PER_VOLUME,
  MASS_INERTIA,
  FORCE,
  FORCE_PER_LENGTH,
  MOMENT,
  PRESSURE,
  PRESSURE_PER_LENGTH,
  STIFFNESS,
  ROTATIONAL_STIFFNESS,
  BENDING_STIFFNESS,
  SPEED,
  ACCELERATION,
  ROTATION_SPEED,
  FREQUENCY,
  ANGLE,
  TIME,
  TEMPERATURE,
  TEMPERATURE_CHANGE,
  THERMAL_EXPANSION,
  POWER
}
