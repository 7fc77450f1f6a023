package org.mastwright.frame;

/** No equilibrium was found: where, after how many iterations, and why probably. */
public final class EquilibriumException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  /** The likely cause. */
  public enum Cause {
    /** Free to move without resistance at the very start. */
    MECHANISM,
    /** Stable up to a load short of the full one. */
    LIMIT_POINT,
    /** The iteration did not settle. */
    NO_CONVERGENCE
  }

  private final Cause likely;
  private final int node;
  private final int iterations;

  EquilibriumException(Cause likely, int node, int iterations, String message) {
    super(message);
    this.likely = likely;
    this.node = node;
    this.iterations = iterations;
  }

  public Cause likely() {
    return likely;
  }

  /** The node with the greatest unbalanced force or the negative pivot, from 0 at the base. */
  public int node() {
    return node;
  }

  public int iterations() {
    return iterations;
  }
}
