package sliprung.cli;

import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import picocli.CommandLine;

/** The program. */
public final class Main {
  private Main() {}

  /** Runs a command and exits with its status. */
  public static void main(String[] arguments) {
    System.setProperty("java.awt.headless", "true");
    PrintWriter out = new PrintWriter(System.out, false, StandardCharsets.UTF_8);
    PrintWriter err = new PrintWriter(System.err, true, StandardCharsets.UTF_8);
    int status = run(arguments, out, err, Terminal.ofProcess());
    out.flush();
    err.flush();
    System.exit(status);
  }

  /** Runs a command in this process; returns its exit status. */
  static int run(String[] arguments, PrintWriter out, PrintWriter err, Terminal terminal) {
    CommandLine line = new CommandLine(new SliprungCommand());
    line.addSubcommand(new ReviewCommand(out, err, terminal));
    line.addSubcommand(new DialsCommand(out, err, terminal));
    line.addSubcommand(new ProposeCommand(out, err, terminal));
    line.addSubcommand(new SampleCommand(out, err));
    line.addSubcommand(new RulesCommand(out, err));
    line.addSubcommand(new CurvesCommand(out));
    line.setOut(out);
    line.setErr(err);
    line.setColorScheme(CommandLine.Help.defaultColorScheme(CommandLine.Help.Ansi.OFF));
    line.setParameterExceptionHandler(
        (mistake, words) -> {
          err.println("sliprung: " + Printable.of(mistake.getMessage()));
          CommandLine.UnmatchedArgumentException.printSuggestions(mistake, err);
          err.println("Try 'sliprung " + tried(mistake) + "--help'.");
          return ExitStatus.WRONG_INPUT;
        });
    line.setExecutionExceptionHandler((defect, command, parsed) -> defect(err, defect));
    try {
      return line.execute(arguments);
    } catch (Error defect) {
      // Out of memory, or a class that does not load: never a stack trace, never half an answer.
      return defect(err, defect);
    }
  }

  private static int defect(PrintWriter err, Throwable defect) {
    StackTraceElement[] at = defect.getStackTrace();
    err.println(
        "sliprung: a defect of the program, not of your file: "
            + defect
            + (at.length > 0 ? " at " + at[0] : ""));
    err.println("Nothing it printed or wrote may be relied on. Please report it.");
    return ExitStatus.DEFECT;
  }

  private static String tried(CommandLine.ParameterException mistake) {
    CommandLine command = mistake.getCommandLine();
    return command.getParent() == null ? "" : command.getCommandName() + " ";
  }
}
