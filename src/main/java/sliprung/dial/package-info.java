/**
 * How far each dial may be turned, and how to turn all of them together. Pure: everything is asked
 * of an {@link sliprung.dial.Evaluation}, under which a faster one may be put.
 */
package sliprung.dial;
