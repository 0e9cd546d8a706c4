/** Numerical methods, thin over Commons Math and named for what we need. */
package sliprung.numeric;
