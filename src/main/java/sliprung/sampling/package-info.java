/** Permitted starts at random points of the spreads: how often something trips, and how near. */
package sliprung.sampling;
