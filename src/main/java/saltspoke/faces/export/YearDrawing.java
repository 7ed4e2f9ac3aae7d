package saltspoke.faces.export;

import com.lowagie.text.BadElementException;
import com.lowagie.text.Image;
import com.lowagie.text.pdf.BaseFont;
import com.lowagie.text.pdf.PdfContentByte;
import com.lowagie.text.pdf.PdfTemplate;
import java.awt.Color;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.List;
import java.util.function.ToDoubleFunction;
import saltspoke.advice.YearPlan;

/** The year inside the rim as bars by month: wetness, salt, damage, and the looks above. */
final class YearDrawing {
  private static final float WIDTH = 515;
  private static final float LABELS = 105;
  private static final float BAR = 26;
  private static final float LANE = 34;
  private static final float HEAD = 28;

  private YearDrawing() {}

  static Image of(YearPlan year, Wording wording, PdfContentByte canvas) {
    PdfTemplate drawing = canvas.createTemplate(WIDTH, HEAD + 3 * LANE);
    try {
      BaseFont font = BaseFont.createFont(BaseFont.HELVETICA, BaseFont.CP1252, false);
      float top = HEAD + 3 * LANE;
      label(drawing, font, wording.say("page-year-look"), top - 23);
      for (int i = 0; i < 12; i++) {
        int month = year.months().get(i).month();
        float middle = left(i) + (WIDTH - LABELS) / 24;
        centred(drawing, font, wording.shortMonth(month), middle, top - 10);
        if (year.lookMonths().contains(month)) {
          nipple(drawing, middle, top - 24);
        }
      }
      lane(
          drawing,
          font,
          wording.say("page-year-wet"),
          year.months(),
          2 * LANE,
          SheetStyle.WET,
          YearPlan.Month::rimWetHours);
      lane(
          drawing,
          font,
          wording.say("page-year-salt"),
          year.months(),
          LANE,
          SheetStyle.SALT,
          YearPlan.Month::chlorideInRimMgPerM2);
      lane(
          drawing,
          font,
          wording.say("page-year-damage"),
          year.months(),
          0,
          SheetStyle.DAMAGE,
          YearPlan.Month::damageShare);
      return Image.getInstance(drawing);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    } catch (BadElementException e) {
      throw new IllegalStateException("the year could not be placed on the sheet", e);
    }
  }

  private static float left(int index) {
    return LABELS + index * (WIDTH - LABELS) / 12;
  }

  private static void lane(
      PdfTemplate drawing,
      BaseFont font,
      String title,
      List<YearPlan.Month> months,
      float base,
      Color color,
      ToDoubleFunction<YearPlan.Month> value) {
    label(drawing, font, title, base + 8);
    double most = months.stream().mapToDouble(value).max().orElse(0);
    drawing.setColorStroke(SheetStyle.LINE);
    drawing.setLineWidth(0.5f);
    drawing.moveTo(LABELS, base + 1);
    drawing.lineTo(WIDTH, base + 1);
    drawing.stroke();
    drawing.setColorFill(color);
    for (int i = 0; i < months.size() && most > 0; i++) {
      float height = (float) (BAR * value.applyAsDouble(months.get(i)) / most);
      drawing.rectangle(left(i) + 2, base + 1, (WIDTH - LABELS) / 12 - 4, height);
      drawing.fill();
    }
  }

  private static void label(PdfTemplate drawing, BaseFont font, String text, float y) {
    drawing.beginText();
    drawing.setColorFill(SheetStyle.INK);
    drawing.setFontAndSize(font, 9);
    drawing.showTextAligned(PdfContentByte.ALIGN_LEFT, Latin.of(text), 0, y, 0);
    drawing.endText();
  }

  private static void centred(PdfTemplate drawing, BaseFont font, String text, float x, float y) {
    drawing.beginText();
    drawing.setColorFill(SheetStyle.SOFT);
    drawing.setFontAndSize(font, 8);
    drawing.showTextAligned(PdfContentByte.ALIGN_CENTER, Latin.of(text), x, y, 0);
    drawing.endText();
  }

  /** The mark of a look: a spoke nipple. */
  private static void nipple(PdfTemplate drawing, float x, float y) {
    drawing.setColorFill(SheetStyle.VERDIGRIS);
    drawing.moveTo(x - 4, y + 9);
    drawing.lineTo(x + 4, y + 9);
    drawing.lineTo(x + 2, y + 5);
    drawing.lineTo(x + 2, y);
    drawing.lineTo(x - 2, y);
    drawing.lineTo(x - 2, y + 5);
    drawing.closePath();
    drawing.fill();
  }
}
