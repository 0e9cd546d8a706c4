package sliprung.record;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDDocumentInformation;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.PDResources;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.pdmodel.graphics.PDXObject;
import org.apache.pdfbox.pdmodel.graphics.form.PDFormXObject;
import org.apache.pdfbox.pdmodel.interactive.documentnavigation.outline.PDOutlineItem;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Test;

class ReviewPdfTest {
  private static final byte[] FILE = ReviewPdf.bytes(Dossiers.plain(), Paper.A4);

  @Test
  void should_carry_the_answer_and_every_section_as_text() throws IOException {
    try (PDDocument pdf = Loader.loadPDF(FILE)) {
      String text = text(pdf, 1, pdf.getNumberOfPages());
      assertThat(text)
          .contains("JC-1 primary jaw crusher")
          .contains("Does a good start get through?")
          .contains("Held on step 2 the motor draws 152 A.")
          .contains("Who opens what")
          .contains("What sees which fault")
          .contains("What the meters show")
          .contains("Interlocks and first start")
          .contains("70 kg·m²")
          .contains("ab".repeat(16))
          .contains("Cautions")
          .contains("Signed");
    }
  }

  @Test
  void should_write_charts_as_vectors_with_text_that_can_be_searched() throws IOException {
    try (PDDocument pdf = Loader.loadPDF(FILE)) {
      assertThat(text(pdf, 1, 1)).contains("seconds from line closing");
      for (PDPage page : pdf.getPages()) {
        assertThat(images(page.getResources())).isZero();
      }
    }
  }

  @Test
  void should_embed_every_font_it_uses_as_a_subset_of_its_own() throws IOException {
    List<PDFont> fonts = new ArrayList<>();
    try (PDDocument pdf = Loader.loadPDF(FILE)) {
      for (PDPage page : pdf.getPages()) {
        fonts(page.getResources(), fonts);
      }
      assertThat(fonts).isNotEmpty();
      for (PDFont font : fonts) {
        assertThat(font.isEmbedded()).as(font.getName()).isTrue();
        assertThat(font.getName()).matches("[A-Z]{6}\\+DejaVuSans(-Bold|Mono)?");
      }
    }
  }

  @Test
  void should_number_every_page_and_head_it_with_starter_date_version_and_record()
      throws IOException {
    try (PDDocument pdf = Loader.loadPDF(FILE)) {
      int pages = pdf.getNumberOfPages();
      assertThat(pages).isBetween(8, 40);
      for (int page = 1; page <= pages; page++) {
        assertThat(text(pdf, page, page))
            .contains("page " + page + " of " + pages)
            .contains("JC-1 primary jaw crusher")
            .contains("2026-12-01 · Sliprung 0.1.0 · record " + Dossiers.plain().fingerprint());
      }
    }
  }

  @Test
  void should_mark_every_section_with_a_bookmark_that_leads_to_it() throws IOException {
    try (PDDocument pdf = Loader.loadPDF(FILE)) {
      List<String> titles = new ArrayList<>();
      for (PDOutlineItem item : pdf.getDocumentCatalog().getDocumentOutline().children()) {
        titles.add(item.getTitle());
        PDPage target = item.findDestinationPage(pdf);
        int page = pdf.getPages().indexOf(target) + 1;
        assertThat(page).as(item.getTitle()).isPositive();
        if (!item.getTitle().equals("The answer")) {
          assertThat(text(pdf, page, page).replaceAll("\\s+", " "))
              .contains(item.getTitle().replaceAll("\\s+", " "));
        }
      }
      assertThat(titles)
          .startsWith("The answer", "1  Does a good start get through?")
          .contains("Settings", "Cautions", "Signed", "Files and their hashes");
    }
  }

  @Test
  void should_name_no_place_of_the_machine_in_its_metadata() throws IOException {
    try (PDDocument pdf = Loader.loadPDF(FILE)) {
      PDDocumentInformation information = pdf.getDocumentInformation();
      assertThat(information.getTitle())
          .isEqualTo("JC-1 primary jaw crusher · review of 2026-12-01");
      assertThat(information.getCreator()).isEqualTo("Sliprung 0.1.0");
      assertThat(information.getCreationDate().toInstant()).hasToString("2026-12-01T00:00:00Z");
      assertThat(information.getAuthor()).isNull();
      String home = System.getProperty("user.dir");
      assertThat(new String(FILE, StandardCharsets.ISO_8859_1)).doesNotContain(home);
    }
  }

  @Test
  void should_come_on_a4_and_on_letter() throws IOException {
    try (PDDocument a4 = Loader.loadPDF(FILE);
        PDDocument letter = Loader.loadPDF(ReviewPdf.bytes(Dossiers.plain(), Paper.LETTER))) {
      assertThat(a4.getPage(0).getMediaBox().getWidth()).isBetween(595f, 596f);
      assertThat(letter.getPage(0).getMediaBox().getWidth()).isEqualTo(612f);
      assertThat(letter.getPage(0).getMediaBox().getHeight()).isEqualTo(792f);
    }
  }

  @Test
  void should_give_the_settings_a_page_of_their_own() throws IOException {
    assertSheetAlone(FILE);
  }

  @Test
  void should_give_many_settings_one_page_too() throws IOException {
    assertSheetAlone(ReviewPdf.bytes(Dossiers.of(ManyDials.review()), Paper.LETTER));
  }

  private static void assertSheetAlone(byte[] file) throws IOException {
    try (PDDocument pdf = Loader.loadPDF(file)) {
      int found = 0;
      for (int page = 1; page <= pdf.getNumberOfPages(); page++) {
        String text = text(pdf, page, page);
        if (text.contains("Write what you find before you turn anything.")) {
          found++;
          assertThat(text).contains("K11", "as found", "Calibrated until", "Witness");
          assertThat(text).doesNotContain("Cautions").doesNotContain("Devices and parts");
        } else {
          assertThat(text).doesNotContain("Calibrated until");
        }
      }
      assertThat(found).isEqualTo(1);
    }
  }

  @Test
  void should_write_the_same_bytes_twice() {
    assertThat(ReviewPdf.bytes(Dossiers.plain(), Paper.A4)).isEqualTo(FILE);
  }

  @Test
  void should_show_hostile_text_as_text_and_load_nothing() throws IOException {
    try (PDDocument pdf = Loader.loadPDF(ReviewPdf.bytes(Dossiers.hostile(), Paper.A4))) {
      String text = text(pdf, 1, pdf.getNumberOfPages());
      assertThat(text).contains("<script>alert(1)</script>").contains("@page { size: 1mm }");
      assertThat(text).doesNotContain("\u0007").doesNotContain("\u001b").doesNotContain("\u202E");
      assertThat(pdf.getDocumentCatalog().getOpenAction()).isNull();
      assertThat(
              pdf.getDocumentCatalog().getNames() == null
                  || pdf.getDocumentCatalog().getNames().getJavaScript() == null)
          .isTrue();
      assertThat(pdf.getPage(0).getMediaBox().getWidth()).isBetween(595f, 596f);
      for (PDPage page : pdf.getPages()) {
        assertThat(images(page.getResources())).isZero();
      }
    }
  }

  private static String text(PDDocument pdf, int from, int to) throws IOException {
    PDFTextStripper stripper = new PDFTextStripper();
    stripper.setStartPage(from);
    stripper.setEndPage(to);
    return stripper.getText(pdf).replace("\u200B", "");
  }

  private static int images(PDResources resources) throws IOException {
    int count = 0;
    for (COSName name : resources.getXObjectNames()) {
      PDXObject object = resources.getXObject(name);
      if (object instanceof PDFormXObject form) {
        count += form.getResources() == null ? 0 : images(form.getResources());
      } else {
        count++;
      }
    }
    return count;
  }

  private static void fonts(PDResources resources, List<PDFont> into) throws IOException {
    for (COSName name : resources.getFontNames()) {
      into.add(resources.getFont(name));
    }
    for (COSName name : resources.getXObjectNames()) {
      if (resources.getXObject(name) instanceof PDFormXObject form && form.getResources() != null) {
        fonts(form.getResources(), into);
      }
    }
  }
}
