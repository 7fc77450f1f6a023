package org.mastwright.assess;

import java.util.ArrayList;
import java.util.List;
import org.mastwright.forces.LimitState;
import org.mastwright.forces.Response;
import org.mastwright.forces.SectionForces;

/** Greatest forces at each place along the mast over all strength cases. */
final class Envelopes {
  private Envelopes() {}

  static List<EnvelopePoint> of(List<SolvedCase> cases) {
    List<Response> strength =
        cases.stream()
            .map(SolvedCase::response)
            .filter(r -> r.mark().limitState() == LimitState.STRENGTH)
            .toList();
    if (strength.isEmpty()) {
      return List.of();
    }
    int stations = strength.get(0).stations().size();
    List<EnvelopePoint> envelope = new ArrayList<>();
    for (int i = 0; i < stations; i++) {
      envelope.add(at(i, strength));
    }
    return List.copyOf(envelope);
  }

  private static EnvelopePoint at(int station, List<Response> responses) {
    double compression_N = Double.NEGATIVE_INFINITY;
    double shear_N = 0;
    double moment_Nm = 0;
    double torque_Nm = 0;
    double movement_m = 0;
    for (Response response : responses) {
      SectionForces s = response.stations().get(station);
      compression_N = Math.max(compression_N, -s.axial_N());
      shear_N = Math.max(shear_N, s.shear_N());
      moment_Nm = Math.max(moment_Nm, s.moment_Nm());
      torque_Nm = Math.max(torque_Nm, Math.abs(s.torque_Nm()));
      movement_m = Math.max(movement_m, Math.hypot(s.east_m(), s.north_m()));
    }
    double height_m = responses.get(0).stations().get(station).height_m();
    return new EnvelopePoint(height_m, compression_N, shear_N, moment_Nm, torque_Nm, movement_m);
  }
}
