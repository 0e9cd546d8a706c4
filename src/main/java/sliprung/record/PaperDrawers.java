package sliprung.record;

import com.openhtmltopdf.extend.FSObjectDrawer;
import com.openhtmltopdf.extend.FSObjectDrawerFactory;
import com.openhtmltopdf.render.DefaultObjectDrawerFactory;
import de.rototor.pdfbox.graphics2d.PdfBoxGraphics2D;
import de.rototor.pdfbox.graphics2d.PdfBoxGraphics2DFontTextDrawer;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Rectangle2D;
import java.util.Map;
import org.apache.pdfbox.pdmodel.font.PDFont;
import sliprung.chart.Picture;

/** Draws charts and margin bars into a PDF as vectors, with text as text in the page's fonts. */
final class PaperDrawers {
  private static final Color LINE = new Color(0x767676);
  private static final Color SHORT = new Color(0xD55E00);
  private static final Color MARK = new Color(0x1A1A1A);

  private PaperDrawers() {}

  static FSObjectDrawerFactory of(Map<String, Picture> pictures, PaperFonts fonts) {
    DefaultObjectDrawerFactory factory = new DefaultObjectDrawerFactory();
    factory.registerDrawer(
        PaperFigures.CHART,
        drawer(
            fonts,
            (g, of, width, height) -> {
              Picture picture = pictures.get(of);
              g.scale(width / picture.width(), height / picture.height());
              picture.painter().paint(g);
            }));
    factory.registerDrawer(
        PaperFigures.BAR,
        drawer(
            fonts,
            (g, of, width, height) -> {
              g.scale(width / MarginBar.WIDTH, height / MarginBar.HEIGHT);
              bar(g, new MarginBar(Double.parseDouble(of)));
            }));
    return factory;
  }

  private interface Painting {
    void paint(Graphics2D g, String of, double width, double height);
  }

  private static FSObjectDrawer drawer(PaperFonts fonts, Painting painting) {
    return (element, x, y, width, height, device, context, dotsPerPixel) -> {
      float wide = (float) (width / dotsPerPixel);
      float high = (float) (height / dotsPerPixel);
      device.drawWithGraphics(
          (float) x,
          (float) y,
          wide,
          high,
          g -> {
            if (g instanceof PdfBoxGraphics2D pdf) {
              pdf.setFontTextDrawer(new Text(fonts));
            }
            // the axes put this hint back as they found it, and no surface takes none
            g.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
            painting.paint(g, element.getAttribute("data-of"), wide, high);
          });
      return null;
    };
  }

  private static void bar(Graphics2D g, MarginBar bar) {
    double high = MarginBar.HEIGHT - 2.0 * MarginBar.TOP - 1.0;
    g.setColor(bar.isShort() ? SHORT : LINE);
    g.fill(new Rectangle2D.Double(0.5, MarginBar.TOP + 0.5, bar.filled(), high));
    g.setColor(LINE);
    g.draw(new Rectangle2D.Double(0.5, MarginBar.TOP + 0.5, MarginBar.WIDTH - 1.0, high));
    g.setColor(MARK);
    g.fill(new Rectangle2D.Double(MarginBar.WIDTH / 2.0 - 1.0, 0.0, 2.0, MarginBar.HEIGHT));
  }

  /** Maps the fonts of charts to the fonts of the document. */
  private static final class Text extends PdfBoxGraphics2DFontTextDrawer {
    private final PaperFonts fonts;

    Text(PaperFonts fonts) {
      this.fonts = fonts;
    }

    @Override
    protected boolean hasDynamicFontMapping() {
      return true;
    }

    @Override
    protected PDFont mapFont(Font font, IFontTextDrawerEnv env) {
      return font.isBold() ? fonts.bold() : fonts.plain();
    }
  }
}
