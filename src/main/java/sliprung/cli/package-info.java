/** The commands; the only main, the only exit, the only clock. */
package sliprung.cli;
