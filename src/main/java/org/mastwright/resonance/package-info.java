/** Natural frequencies against rotor orders: windows to avoid, clear ranges, separation checks. */
package org.mastwright.resonance;
