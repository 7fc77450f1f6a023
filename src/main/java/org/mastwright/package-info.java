/**
 * Checks the tower of a small wind turbine. See DEVELOPERS.md for the packages and who may use
 * whom.
 */
package org.mastwright;
