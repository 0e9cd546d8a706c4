/** Rules about the inputs themselves: plate, plausibility, curves that end too early. */
package sliprung.rulebook.data;
