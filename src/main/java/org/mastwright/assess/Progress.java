package org.mastwright.assess;

/** Told how far a run has come; may be called from any thread. */
@FunctionalInterface
public interface Progress {
  /** Tells nobody. */
  Progress NONE = (words, done, of) -> {};

  /**
   * @param words the stage, such as {@code storm wind}
   * @param done steps finished
   * @param of steps in this stage
   */
  void stage(String words, int done, int of);
}
