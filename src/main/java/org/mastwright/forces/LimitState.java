package org.mastwright.forces;

/** What a load case is there to show. */
public enum LimitState {
  /** Factored loads against resistances. */
  STRENGTH,
  /** The same actions without partial factors: reactions for the ground and for comparison. */
  CHARACTERISTIC,
  /** Everyday extremes: lean, clearances, slack guys. */
  SERVICE,
  /** Loss of a guy or an anchor: a finding. */
  ROBUSTNESS,
  /** Direct loads of a verification file. */
  VERIFICATION
}
