package sliprung.record;

/**
 * A file that a review was made from, kept whole so that the review can be made again.
 *
 * @param name of the file, without a path of the machine it lay on
 * @param sha256 of its bytes, hexadecimal
 * @param text what it says
 */
public record InputFile(String name, String sha256, String text) {}
