/** A unit, a dimensional value: parse and print. A leaf: it uses nothing of the project. */
package org.mastwright.units;
