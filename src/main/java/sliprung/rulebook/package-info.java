/**
 * The rule book: what a rule may look at, what it answers, the engine that asks every rule, and the
 * practices' figures. The rules themselves lie in the packages named after their families.
 */
package sliprung.rulebook;
