/** A number with its formula and source: clause, formula, step, check, finding. */
package org.mastwright.working;
