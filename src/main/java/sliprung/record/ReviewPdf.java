package sliprung.record;

import com.openhtmltopdf.outputdevice.helper.BaseRendererBuilder.FontStyle;
import com.openhtmltopdf.outputdevice.helper.ExternalResourceControlPriority;
import com.openhtmltopdf.pdfboxout.PDFontSupplier;
import com.openhtmltopdf.pdfboxout.PdfBoxRenderer;
import com.openhtmltopdf.pdfboxout.PdfRendererBuilder;
import com.openhtmltopdf.util.XRLog;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.time.ZoneOffset;
import java.util.Calendar;
import java.util.GregorianCalendar;
import java.util.TimeZone;
import java.util.logging.Level;
import java.util.logging.Logger;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDDocumentInformation;
import sliprung.review.Review;

/**
 * Writes {@code review.pdf}: the layout of {@code review.html} on paper, with running header, page
 * numbers and bookmarks. The same dossier gives the same bytes; nothing is loaded from outside.
 */
public final class ReviewPdf {
  private static final int HEX = 16;

  /** Held, since a logger that nobody holds forgets its level. */
  private static final Logger PDFBOX = Logger.getLogger("org.apache.pdfbox");

  private static final Logger FONTBOX = Logger.getLogger("org.apache.fontbox");

  private ReviewPdf() {}

  /** The file. */
  public static byte[] bytes(Dossier dossier, Paper paper) {
    return bytes(Contents.of(dossier), paper);
  }

  static byte[] bytes(Contents contents, Paper paper) {
    Dossier dossier = contents.dossier();
    XRLog.setLoggingEnabled(false);
    PDFBOX.setLevel(Level.OFF);
    FONTBOX.setLevel(Level.OFF);
    PaperFigures figures = new PaperFigures(paper);
    String page = PaperPage.text(contents, paper, figures);
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    try (PDDocument document = new PDDocument()) {
      document.setDocumentId(Long.parseUnsignedLong(dossier.fingerprint(), HEX));
      PaperFonts fonts = PaperFonts.in(document);
      PdfRendererBuilder builder = new PdfRendererBuilder();
      builder.usePDDocument(document);
      font(builder, fonts.plain(), PaperPage.SANS, 400);
      font(builder, fonts.bold(), PaperPage.SANS, 700);
      font(builder, fonts.mono(), PaperPage.MONO, 400);
      builder.useReplacementText("\uFFFD");
      builder.useExternalResourceAccessControl(
          (uri, type) -> false, ExternalResourceControlPriority.RUN_BEFORE_RESOLVING_URI);
      builder.useExternalResourceAccessControl(
          (uri, type) -> false, ExternalResourceControlPriority.RUN_AFTER_RESOLVING_URI);
      builder.useObjectDrawerFactory(PaperDrawers.of(figures.pictures(), fonts));
      builder.withHtmlContent(page, "");
      try (PdfBoxRenderer renderer = builder.buildPdfRenderer()) {
        renderer.createPDFWithoutClosing();
        describe(document, dossier);
        document.save(out);
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return out.toByteArray();
  }

  private static void font(
      PdfRendererBuilder builder,
      org.apache.pdfbox.pdmodel.font.PDFont font,
      String family,
      int weight) {
    builder.useFont(new PDFontSupplier(font), family, weight, FontStyle.NORMAL, true);
  }

  private static void describe(PDDocument document, Dossier dossier) {
    Review review = dossier.review();
    PDDocumentInformation information = new PDDocumentInformation();
    information.setTitle(PaperPage.title(review));
    information.setSubject("Review of protection and contactors, record " + dossier.fingerprint());
    information.setCreator("Sliprung " + dossier.program());
    information.setProducer("Sliprung " + dossier.program());
    Calendar day = new GregorianCalendar(TimeZone.getTimeZone(ZoneOffset.UTC));
    day.setTimeInMillis(review.date().atStartOfDay(ZoneOffset.UTC).toInstant().toEpochMilli());
    information.setCreationDate(day);
    information.setModificationDate(day);
    document.setDocumentInformation(information);
    document.getDocumentCatalog().setLanguage("en");
  }
}
