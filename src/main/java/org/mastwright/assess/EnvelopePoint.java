package org.mastwright.assess;

/** Greatest values at one place over all strength cases; compression is positive here. */
public record EnvelopePoint(
    double height_m,
    double compression_N,
    double shear_N,
    double moment_Nm,
    double torque_Nm,
    double movement_m) {}
