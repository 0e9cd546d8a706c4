package sliprung.cli;

import picocli.CommandLine.IVersionProvider;

/** The version in the jar's manifest. */
final class ProgramVersion implements IVersionProvider {
  @Override
  public String[] getVersion() {
    return new String[] {"sliprung " + text()};
  }

  static String text() {
    String version = Main.class.getPackage().getImplementationVersion();
    return version == null ? "development" : version;
  }
}
