/**
 * The whole review of one starter: facts computed once, rule book run over them. No I/O, no clock.
 */
package sliprung.review;
