/** Rules: the rotor bank. */
package sliprung.rulebook.resistor;
