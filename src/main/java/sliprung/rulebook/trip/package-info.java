/** Rules: a permitted start must not be interrupted. */
package sliprung.rulebook.trip;
