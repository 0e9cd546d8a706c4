/** Rules: a rotor that does not turn. */
package sliprung.rulebook.locked;
