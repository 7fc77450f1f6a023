package org.mastwright.working;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/** Every check id in plain words; a test finds each id that an example produces in here. */
public final class CheckCatalogue {
  private static final Map<String, String> WORDS = words();

  private CheckCatalogue() {}

  private static Map<String, String> words() {
    Map<String, String> m = new LinkedHashMap<>();
    m.put(
        "tube-strength",
        "Bending with axial force in the worst section of each tube, second order, factored:"
            + " EN 1993-1-1 6.2.9 or AISC 360 H1.");
    m.put(
        "tube-shear",
        "Shear with twist in the worst section of each tube: EN 1993-1-1 6.2.7 or AISC 360 G5, H3.");
    m.put(
        "stability-limit",
        "The variable actions are scaled until the tower loses its balance; at least 1.0 times the"
            + " factored ones must be held. Less than 1.15 is flagged.");
    m.put(
        "joint-strength",
        "What a joint must bear. Its own strength is not calculated; an engineer checks it.");
    m.put(
        "base-plate",
        "What foot plate and bolts must bear. Not calculated; an engineer checks it.");
    m.put("footing-strength", "What the footing must bear. Not calculated; an engineer checks it.");
    m.put(
        "guy-strength",
        "Greatest tension of each level against breaking force times end efficiency over 1.1"
            + " (IEC 61400-2).");
    m.put(
        "guy-hardware",
        "Greatest tension of the level against the breaking load of turnbuckle, shackle or the like"
            + " over 1.1. Give working-load with safety, or breaking.");
    m.put(
        "guy-slack",
        "While the rotor runs every guy keeps at least a tenth of its still-air level pull.");
    m.put(
        "anchor-capacity",
        "The vector sum of all guys at an anchor against what it held in a test over 1.1. Other"
            + " anchors are listed with the pull they must hold.");
    m.put(
        "resonance-order-N",
        "Distance of each natural frequency that moves the hub from N times the rotor speed, over"
            + " all speeds it dwells at: 10 %, or 20 % where the foot's stiffness is unknown.");
    m.put("top-lean", "Lean of the mast top in the one-year wind, at most 5 degrees (practice).");
    m.put(
        "blade-guy-clearance",
        "From the space the blades sweep in all yaw directions to every guy, both moved: 0.3 m.");
    m.put("blade-height", "Lowest blade tip above ground against the local rule that was given.");
    m.put("fall-circle", "Total height (times the local multiplier) against each boundary.");
    m.put("overhead-line", "1.5 times the total height against the distance to power lines.");
    return m;
  }

  /** The words for an id; {@code resonance-order-3} is found under its N. */
  public static Optional<String> of(String id) {
    String key = id.startsWith("resonance-order-") ? "resonance-order-N" : id;
    return Optional.ofNullable(WORDS.get(key));
  }
}
