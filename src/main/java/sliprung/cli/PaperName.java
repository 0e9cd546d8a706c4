package sliprung.cli;

import java.util.Locale;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;
import sliprung.record.Paper;

/** Reads a size of paper. */
final class PaperName implements ITypeConverter<Paper> {
  @Override
  public Paper convert(String text) {
    for (Paper paper : Paper.values()) {
      if (paper.name().toLowerCase(Locale.ROOT).equals(text.toLowerCase(Locale.ROOT))) {
        return paper;
      }
    }
    throw new TypeConversionException(
        "expected a4 or letter but found '" + Printable.of(text) + "'");
  }
}
