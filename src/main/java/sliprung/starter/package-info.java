/**
 * The described starter as records: what it is, in SI units, before anything is computed. Optional
 * quantities that the user left out stay empty; defaults that were filled in are listed in {@link
 * sliprung.starter.Starter#assumptions()}.
 */
package sliprung.starter;
