/**
 * Who sees a start: every device at its edges and every part against its limit, over a computed
 * history, with two primitives: a first-order thermal element and an accumulating element.
 *
 * <p>From the outside in: {@link sliprung.protection.ProtectionEvaluator} answers about a starter,
 * {@link sliprung.protection.StartProtection} about one history. Inside, {@code Currents} takes
 * each current out of the history as a {@code Waveform} of {@code Piece}s; an {@code EdgeModel} is
 * one device at one edge and a {@code Part} one heated part, both of which make a fresh {@code
 * Meter} for every question; a {@code Passage} moves the meter along the waveform; {@code Margin}
 * repeats that with a multiplied start. {@link sliprung.protection.Bands} asks the same models at
 * constant currents, for charts and crossings.
 */
package sliprung.protection;
