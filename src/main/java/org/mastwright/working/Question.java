package org.mastwright.working;

/** The plain question a check helps to answer; the order is the order of the pages. */
public enum Question {
  TUBE("Will the pipe hold?", "Pipe and joints"),
  GUYS("Will the guys hold?", "Guys and ends"),
  ANCHORS("Will the anchors hold?", "Anchors"),
  FOOT("Will the foot hold?", "Foot and bolts"),
  FOOTING("Will the footing hold?", "Footing"),
  ROTOR_SPEED("Can the rotor run freely?", "Rotor speeds"),
  CLEARANCE("Do the blades keep clear?", "Lean and clearance"),
  AROUND("Is there room around it?", "Around it"),
  RAISING("Can it be raised?", "Raising"),
  SOUNDNESS("Does the calculation balance?", "Self-check");

  private final String question;
  private final String heading;

  Question(String question, String heading) {
    this.question = question;
    this.heading = heading;
  }

  /** As asked on the terminal. */
  public String question() {
    return question;
  }

  /** As a heading of the report. */
  public String heading() {
    return heading;
  }
}
