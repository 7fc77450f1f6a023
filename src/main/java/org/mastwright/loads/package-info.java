/** Load cases of each basis: wind, rotor, weight, ice and pretension, factors, directions. */
package org.mastwright.loads;
