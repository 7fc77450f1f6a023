package org.mastwright.file;

import java.util.List;
import java.util.Optional;
import org.mastwright.design.Design;
import org.mastwright.working.DefaultTaken;
import org.mastwright.working.Finding;

/**
 * What reading a tower file gave.
 *
 * @param design empty when there is an error
 * @param faults errors first, then warnings, each in the order of the file
 * @param findings open points and notes for the assessment
 */
public record Reading(
    Optional<Design> design,
    List<Finding> faults,
    List<Finding> findings,
    List<DefaultTaken> defaults,
    String fileName,
    String sha256) {
  public Reading {
    faults = List.copyOf(faults);
    findings = List.copyOf(findings);
    defaults = List.copyOf(defaults);
  }
}
