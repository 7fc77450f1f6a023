package org.mastwright.assess;

/** Linear buckling factor of a case: information, not a proof. */
public record BucklingResult(String caseId, double criticalFactor) {}
