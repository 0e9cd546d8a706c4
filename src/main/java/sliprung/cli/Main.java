package sliprung.cli;

/** The program. */
public final class Main {
  private Main() {}

  /** Runs a command and exits with its status. */
  public static void main(String[] arguments) {
    System.exit(2);
  }
}
