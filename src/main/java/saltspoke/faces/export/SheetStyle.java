package saltspoke.faces.export;

import com.lowagie.text.Chunk;
import com.lowagie.text.Element;
import com.lowagie.text.Font;
import com.lowagie.text.FontFactory;
import com.lowagie.text.ListItem;
import com.lowagie.text.Paragraph;
import com.lowagie.text.Phrase;
import com.lowagie.text.pdf.PdfPCell;
import java.awt.Color;
import java.util.List;

/** Type and colours of the customer sheet, and its small building blocks. */
final class SheetStyle {
  static final Color INK = new Color(0x15, 0x25, 0x2A);
  static final Color SOFT = new Color(0x4A, 0x5D, 0x62);
  static final Color LINE = new Color(0xC9, 0xD4, 0xD3);
  static final Color VERDIGRIS = new Color(0x0D, 0x4A, 0x47);
  static final Color PALE = new Color(0xDC, 0xEB, 0xE8);
  static final Color RUST = new Color(0x94, 0x33, 0x1A);
  static final Color WET = new Color(0x33, 0x71, 0x9C);
  static final Color SALT = new Color(0xA9, 0x78, 0x1F);
  static final Color DAMAGE = new Color(0xB4, 0x50, 0x1F);

  private SheetStyle() {}

  static Font font(float size, boolean bold, Color color) {
    return FontFactory.getFont(
        bold ? FontFactory.HELVETICA_BOLD : FontFactory.HELVETICA, size, Font.NORMAL, color);
  }

  static Phrase text(String text, float size, boolean bold, Color color) {
    return new Phrase(Latin.of(text), font(size, bold, color));
  }

  static Paragraph paragraph(String text, float size, boolean bold, Color color) {
    Paragraph paragraph = new Paragraph(Latin.of(text), font(size, bold, color));
    paragraph.setLeading(size * 1.3f);
    return paragraph;
  }

  static Paragraph heading(String text, Color color) {
    Paragraph heading = paragraph(text, 11, true, color);
    heading.setSpacingBefore(8);
    heading.setSpacingAfter(2);
    return heading;
  }

  static com.lowagie.text.List bullets(List<String> sentences, boolean numbered) {
    com.lowagie.text.List list = new com.lowagie.text.List(numbered, 12);
    if (!numbered) {
      list.setListSymbol(new Chunk("\u2022", font(9.5f, true, VERDIGRIS)));
    }
    for (String sentence : sentences) {
      ListItem item = new ListItem(Latin.of(sentence), font(9.5f, false, INK));
      item.setLeading(12.5f);
      list.add(item);
    }
    return list;
  }

  /** A borderless cell with a small label above its text. */
  static PdfPCell fact(String label, String value, Color color) {
    PdfPCell cell = new PdfPCell();
    cell.setBorder(0);
    cell.setPadding(0);
    cell.setPaddingRight(8);
    cell.addElement(paragraph(label, 8, false, color));
    cell.addElement(paragraph(value, 10.5f, true, color));
    return cell;
  }

  static PdfPCell cell(Phrase phrase, int alignment) {
    PdfPCell cell = new PdfPCell(phrase);
    cell.setBorder(PdfPCell.BOTTOM);
    cell.setBorderColor(LINE);
    cell.setPadding(3);
    cell.setPaddingLeft(0);
    cell.setHorizontalAlignment(alignment);
    cell.setVerticalAlignment(Element.ALIGN_MIDDLE);
    return cell;
  }
}
