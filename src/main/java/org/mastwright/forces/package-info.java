/**
 * What a solved load case says about the tower: section forces, guy forces, reactions, movements.
 *
 * <p>Sign conventions, once for all: axes are east, north, up; axial force is positive in tension;
 * a moment is about the axis named, right-handed; a reaction is what the ground does to the mast;
 * an anchor pull is what the guy does to the anchor.
 */
package org.mastwright.forces;
