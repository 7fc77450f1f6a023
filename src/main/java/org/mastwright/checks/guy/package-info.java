/** Checks of one kind, each from section forces and design alone. */
package org.mastwright.checks.guy;
