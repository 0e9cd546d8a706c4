/** The rule catalogue: every rule that is built, every rule of the book that is not yet. */
package sliprung.rulebook.catalogue;
