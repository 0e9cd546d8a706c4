/** Rules: the closing of the steps and its supervision. */
package sliprung.rulebook.sequence;
