package org.mastwright.assess;

import java.util.List;
import org.mastwright.forces.Response;

/**
 * A solved case.
 *
 * @param governs ids of the checks it governs; empty for most
 */
public record CaseResult(Response response, List<String> governs) {
  public CaseResult {
    governs = List.copyOf(governs);
  }
}
