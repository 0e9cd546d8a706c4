/**
 * Who sees a start: every device at its edges and every part against its limit, over a computed
 * history, with two primitives: a first-order thermal element and an accumulating element.
 */
package sliprung.protection;
