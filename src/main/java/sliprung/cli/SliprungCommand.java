package sliprung.cli;

import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** The program without a command. */
@Command(
    name = "sliprung",
    mixinStandardHelpOptions = true,
    versionProvider = ProgramVersion.class,
    description = {
      "Holds a rotor-resistance starter against its protection: computes the start and the failed"
          + " starts, runs them through every device, judges them by a rule book.",
      ""
    },
    footer = {
      "",
      "Exit status: 0 no breach; 1 a breach that nobody accepted; 2 the input or the call is wrong;"
          + " 3 a defect of the program; 4 no breach, but a rule that must be judged could not be."
    })
final class SliprungCommand implements Runnable {
  @Spec private CommandSpec spec;

  @Override
  public void run() {
    throw new ParameterException(spec.commandLine(), "a command is missing");
  }
}
