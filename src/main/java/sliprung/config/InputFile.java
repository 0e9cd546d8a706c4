package sliprung.config;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/**
 * A file that was read: what a record needs to be checked against its inputs.
 *
 * @param name as the user gave it
 * @param bytes of the file, byte for byte
 * @param text decoded, without a byte order mark
 */
public record InputFile(String name, byte[] bytes, String text) {

  /** Copies the bytes. */
  public InputFile {
    bytes = bytes.clone();
  }

  @Override
  public byte[] bytes() {
    return bytes.clone();
  }

  /** SHA-256 of the bytes in lower-case hexadecimal. */
  public String sha256() {
    try {
      return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof InputFile f
        && name.equals(f.name)
        && java.util.Arrays.equals(bytes, f.bytes);
  }

  @Override
  public int hashCode() {
    return 31 * name.hashCode() + java.util.Arrays.hashCode(bytes);
  }

  @Override
  public String toString() {
    return "InputFile[" + name + ", " + bytes.length + " bytes]";
  }
}
