/** Rules: a step contactor that fails to close. */
package sliprung.rulebook.held;
