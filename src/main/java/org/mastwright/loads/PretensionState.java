package org.mastwright.loads;

/** How taut the guys are; a state with a factor of 1, never a load with a partial factor. */
public enum PretensionState {
  /** As stated, at the setting temperature. */
  NOMINAL,
  /**
   * Less by the setting tolerance and 5 % slip, in the hottest weather; snug: 0.5 % of breaking.
   */
  LOW,
  /** More by the setting tolerance, in the coldest weather; snug: 5 % of breaking. */
  HIGH,
  /** As stated, one guy of the top level 10 % off. */
  UNEVEN
}
