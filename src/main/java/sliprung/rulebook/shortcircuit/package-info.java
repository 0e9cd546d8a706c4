/** Rules about the devices that clear a short circuit in the stator line. */
package sliprung.rulebook.shortcircuit;
