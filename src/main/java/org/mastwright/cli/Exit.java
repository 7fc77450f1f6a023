package org.mastwright.cli;

/** The exit codes. */
final class Exit {
  static final int PASSES = 0;
  static final int FAILS = 1;
  static final int INCOMPLETE = 2;
  static final int WRONG_FILE = 3;
  static final int NO_EQUILIBRIUM = 4;
  static final int NOT_WRITTEN = 5;
  static final int WRONG_COMMAND = 64;
  static final int FAULT = 70;

  /** What the Java machine itself ends with on an interrupt; nothing in here returns it. */
  static final int STOPPED = 130;

  private Exit() {}
}
