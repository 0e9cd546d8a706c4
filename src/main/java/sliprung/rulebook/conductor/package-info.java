/** Rules about the cables to the stator and from the rings to the bank. */
package sliprung.rulebook.conductor;
