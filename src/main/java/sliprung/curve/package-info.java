/**
 * Time-current laws: inverse-time families, trip classes as sets of relays, fuse gates, curves
 * given as points, and the library that holds them. Numbers only; nothing here knows a starter.
 */
package sliprung.curve;
