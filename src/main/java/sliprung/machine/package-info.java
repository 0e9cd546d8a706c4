/**
 * The slip-ring machine in the steady state: equivalent circuit, operating points, identification
 * from a nameplate. Pure functions of slip and rotor-circuit resistance.
 */
package sliprung.machine;
