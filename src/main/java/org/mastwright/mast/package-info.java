/** Idealises a tower as a chain, sets its guys, applies load cases and recovers forces. */
package org.mastwright.mast;
