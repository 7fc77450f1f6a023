package org.mastwright.file;

import java.util.Map;
import java.util.Optional;

/** More on each fault of a tower file. */
public final class FaultCatalogue {
  private static final Map<String, String> WORDS =
      Map.ofEntries(
          Map.entry("E1", "Every dimensional value carries its unit: 115 mph, 12.5 m, 5 ft 6 in."),
          Map.entry(
              "E2",
              "Maps since 2010 print ultimate speeds, older ones nominal (50-year) speeds; the"
                  + " pressure differs by 40 %. The map's title or year tells which it is."),
          Map.entry("E3", "Write 1500, not 1,500: the comma is a decimal sign to some readers."),
          Map.entry("E4", "The site's wind is a class or a speed, never both."),
          Map.entry("E5", "The key is not known at this place; the nearest known one is named."),
          Map.entry("E6", "The unit measures something else than this key means."),
          Map.entry("E7", "A pull is a force: kN, lbf or kgf. Spring scales in kg show kgf."),
          Map.entry(
              "E8", "Pipe is called by a trade size that is not its outside; measure or say pipe."),
          Map.entry("E9", "Steel is never guessed. A stencil, a certificate or a test tells it."),
          Map.entry("E10", "A guy that reaches into the space the blades sweep is parted by them."),
          Map.entry(
              "E11", "The place is not on the mast; height counts from the ground at its foot."),
          Map.entry("E12", "Tension differs between the ends by the guy's weight: say which end."),
          Map.entry("E13", "A list has one value for all guys of a set or one for each."),
          Map.entry("E14", "Pulls at one anchor add up; eyes apart do not share."),
          Map.entry("E15", "A working load says nothing without its factor."),
          Map.entry("E16", "A many-sided tube is wider across its corners than across its flats."),
          Map.entry(
              "E17",
              "An upright rotor has no hub height, overhang, tilt or upwind side; its blades begin"
                  + " `upright.rotor-bottom-above-top` above the mast top."),
          Map.entry("E18", "A logarithmic decrement is 2 pi times the damping ratio."),
          Map.entry("E19", "A rod set in line with the guy does not go down by its length."),
          Map.entry("E20", "A lattice has members of its own that one tube would hide."));

  private FaultCatalogue() {}

  /** The words for an id such as {@code E2}. */
  public static Optional<String> of(String id) {
    return Optional.ofNullable(WORDS.get(id));
  }
}
