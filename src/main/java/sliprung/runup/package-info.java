/**
 * The staged start and the failed starts: from a scenario and its conditions to a history of speed,
 * currents and torque. Nothing here knows a protective device.
 */
package sliprung.runup;
