/**
 * What the user describes, resolved: SI units, defaults taken, trade sizes looked up, anchors
 * placed. Axes: east, north, up from the datum at the mast foot; angles are true bearings,
 * clockwise from north, in radians. Text that was not given is blank; a part that was not given is
 * empty.
 */
package org.mastwright.design;
