/** Rules about overload relays: what a dial means in amperes. */
package sliprung.rulebook.overload;
