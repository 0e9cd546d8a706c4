/** Corners of a starter's spreads: the circumstances over which every verdict is taken. */
package sliprung.tolerance;
