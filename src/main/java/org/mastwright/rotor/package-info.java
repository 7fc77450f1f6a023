/** What the rotor takes from the wind and what it does to the tower. */
package org.mastwright.rotor;
