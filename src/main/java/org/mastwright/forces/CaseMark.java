package org.mastwright.forces;

/**
 * Which load case a response belongs to.
 *
 * @param id unique in a run, such as {@code I1-225-lo}
 * @param combination code of its combination, such as {@code I1}
 * @param title in words: {@code storm from 225, stopped, loose guys}
 * @param basis as printed, such as {@code IEC 61400-2 simplified}
 * @param windFrom_rad true bearing the wind comes from
 * @param thrust_N level force on the rotor and head in this case, factored as the case is
 * @param running whether the rotor turns under power in it
 */
public record CaseMark(
    String id,
    String combination,
    String title,
    String basis,
    LimitState limitState,
    double windFrom_rad,
    double thrust_N,
    boolean running) {}
