package org.mastwright.assess;

import org.mastwright.forces.Response;
import org.mastwright.loads.LoadCase;

/** A load case with its solution; kept inside the pipeline. */
record SolvedCase(LoadCase loads, Response response) {}
