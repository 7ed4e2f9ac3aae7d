package saltspoke.faces.export;

import com.lowagie.text.Document;
import com.lowagie.text.DocumentException;
import com.lowagie.text.Element;
import com.lowagie.text.PageSize;
import com.lowagie.text.Paragraph;
import com.lowagie.text.Phrase;
import com.lowagie.text.pdf.PdfPCell;
import com.lowagie.text.pdf.PdfPTable;
import com.lowagie.text.pdf.PdfWriter;
import java.awt.Color;
import java.io.ByteArrayOutputStream;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import saltspoke.advice.Advice;
import saltspoke.advice.PairingAdvice;
import saltspoke.advice.StateTimes;
import saltspoke.atmosphere.MetalCorrosivity;
import saltspoke.faces.Texts;
import saltspoke.places.Place;
import saltspoke.values.Note;

/**
 * The sheet that a customer takes home, A4: interval first and large, then why, the year, the
 * dates, how to look, and when to stop; the cautions stand right under the interval.
 */
public final class CustomerSheetPdf {
  private static final int MOST_REASONS = 4;
  private static final int MOST_DATES = 8;

  private final Advice advice;
  private final PairingAdvice pairing;
  private final Wording wording;
  private final Units units;
  private final LocalDate today;

  private CustomerSheetPdf(Advice advice, Texts texts, Units units, LocalDate today) {
    this.advice = advice;
    this.pairing = advice.pairings().get(0);
    this.wording = new Wording(texts);
    this.units = units;
    this.today = today;
  }

  /**
   * The sheet of the first pairing of an answer.
   *
   * @param today day from which the answer counts
   */
  public static byte[] render(Advice advice, Texts texts, Units units, LocalDate today) {
    return new CustomerSheetPdf(advice, texts, units, today).bytes();
  }

  private byte[] bytes() {
    ByteArrayOutputStream out = new ByteArrayOutputStream(32 * 1024);
    try (Document document = new Document(PageSize.A4, 40, 40, 34, 34)) {
      PdfWriter writer = PdfWriter.getInstance(document, out);
      document.addTitle("Saltspoke – " + Latin.of(wording.say("page-claim")));
      document.addSubject(Latin.of(wording.place(advice.air().place())));
      document.setDocumentLanguage(wording.locale().getLanguage());
      document.open();
      document.add(head());
      document.add(tag());
      document.add(SheetStyle.heading(wording.say("page-cautions"), SheetStyle.RUST));
      document.add(SheetStyle.bullets(said(advice.cautions()), false));
      document.add(SheetStyle.heading(wording.say("page-why"), SheetStyle.VERDIGRIS));
      document.add(SheetStyle.bullets(reasons(), false));
      document.add(SheetStyle.heading(wording.say("page-times"), SheetStyle.VERDIGRIS));
      document.add(times());
      document.add(SheetStyle.heading(wording.say("page-year"), SheetStyle.VERDIGRIS));
      document.add(YearDrawing.of(advice.year(), wording, writer.getDirectContent()));
      document.add(SheetStyle.heading(wording.say("page-sheet-dates"), SheetStyle.VERDIGRIS));
      document.add(SheetStyle.paragraph(dates(), 9.5f, false, SheetStyle.INK));
      document.add(SheetStyle.heading(wording.say("page-how-to-look"), SheetStyle.VERDIGRIS));
      document.add(SheetStyle.bullets(said(advice.look()), true));
      document.add(SheetStyle.heading(wording.say("page-stop"), SheetStyle.RUST));
      document.add(SheetStyle.bullets(said(advice.stopSigns()), false));
    } catch (DocumentException e) {
      throw new IllegalStateException("the customer sheet could not be set", e);
    }
    return out.toByteArray();
  }

  private PdfPTable head() {
    PdfPTable table = table(2);
    PdfPCell name = new PdfPCell(SheetStyle.text("Saltspoke", 15, true, SheetStyle.VERDIGRIS));
    name.setBorder(0);
    PdfPCell date =
        new PdfPCell(SheetStyle.text(wording.date(today), 9.5f, false, SheetStyle.SOFT));
    date.setBorder(0);
    date.setHorizontalAlignment(Element.ALIGN_RIGHT);
    date.setVerticalAlignment(Element.ALIGN_BOTTOM);
    table.addCell(name);
    table.addCell(date);
    table.setSpacingAfter(6);
    return table;
  }

  /** The box with the interval. */
  private PdfPTable tag() {
    PdfPCell box = new PdfPCell();
    box.setBorderColor(SheetStyle.VERDIGRIS);
    box.setBorderWidth(1.5f);
    box.setBackgroundColor(SheetStyle.PALE);
    box.setPadding(10);
    Color ink = SheetStyle.INK;
    Place place = advice.air().place();
    box.addElement(SheetStyle.paragraph(wording.place(place), 12, true, ink));
    box.addElement(
        SheetStyle.paragraph(
            wording.say(
                "page-place-facts",
                Map.of(
                    "height", units.height(place.elevationM()),
                    "distance", units.distance(place.sea().distanceKm(), wording.locale()))),
            9.5f,
            false,
            SheetStyle.SOFT));
    String profileCode = "page-profile-" + advice.request().profile().name();
    String profile = wording.say(profileCode);
    box.addElement(
        SheetStyle.paragraph(
            (profile.equals(profileCode) ? advice.request().profile().title() : profile)
                + " · "
                + wording.pairing(pairing.pairing()),
            9.5f,
            false,
            ink));
    Paragraph lead = SheetStyle.paragraph(wording.say("page-first-look"), 11, false, ink);
    lead.setSpacingBefore(8);
    box.addElement(lead);
    Paragraph interval =
        SheetStyle.paragraph(
            wording.span(pairing.firstLookMonths()), 30, true, SheetStyle.VERDIGRIS);
    interval.setSpacingAfter(8);
    box.addElement(interval);
    LocalDate first = Wording.after(today, pairing.firstLookMonths());
    box.addElement(
        SheetStyle.paragraph(
            wording.say("page-by-date", Map.of("date", wording.date(first)))
                + " "
                + wording.say(
                    "page-then-every", Map.of("every", wording.every(pairing.everyMonths()))),
            11,
            true,
            ink));
    Paragraph because = SheetStyle.paragraph(wording.limit(pairing), 9.5f, false, ink);
    because.setSpacingAfter(6);
    box.addElement(because);
    box.addElement(facts());
    PdfPTable table = table(1);
    table.addCell(box);
    return table;
  }

  private PdfPTable facts() {
    PdfPTable facts = table(3);
    facts.addCell(SheetStyle.fact(wording.say("page-replace"), replaceBy(), SheetStyle.INK));
    facts.addCell(
        SheetStyle.fact(
            wording.say("page-look-kind"),
            wording.say("page-look-" + pairing.lookKind())
                + ", "
                + wording.say("page-unit-minutes", Map.of("value", pairing.lookMinutes())),
            SheetStyle.INK));
    facts.addCell(
        SheetStyle.fact(
            wording.say("page-classes"),
            advice.air().corrosivity().stream()
                .map(this::classOf)
                .collect(Collectors.joining(" · ")),
            SheetStyle.INK));
    return facts;
  }

  private String classOf(MetalCorrosivity metal) {
    return wording.say("page-metal-" + metal.metal().id()) + " " + metal.category().name();
  }

  private String replaceBy() {
    if (pairing.replaceByMonths() == null) {
      return wording.say("page-replace-none");
    }
    return wording.say(
        "page-replace-when",
        Map.of(
            "span", wording.span(pairing.replaceByMonths()),
            "date", wording.date(Wording.after(today, pairing.replaceByMonths()))));
  }

  private PdfPTable times() {
    PdfPTable table = table(2);
    row(table, "page-attack", pairing.firstAttackMonths());
    row(table, "page-seized", pairing.seizedMonths());
    row(table, "page-head-loss", pairing.headLossMonths());
    return table;
  }

  private void row(PdfPTable table, String code, StateTimes times) {
    String title = wording.say(code);
    if (!times.notApplicable()) {
      title += " (" + wording.say("page-at-" + times.part()) + ")";
    }
    Phrase range = SheetStyle.text(wording.range(times), 9.5f, true, SheetStyle.INK);
    table.addCell(
        SheetStyle.cell(SheetStyle.text(title, 9.5f, false, SheetStyle.INK), Element.ALIGN_LEFT));
    table.addCell(SheetStyle.cell(range, Element.ALIGN_LEFT));
  }

  private List<String> reasons() {
    List<String> reasons = new ArrayList<>(said(pairing.reasons()));
    reasons.add(wording.say(advice.air().summary()));
    return reasons.subList(0, Math.min(MOST_REASONS, reasons.size()));
  }

  private String dates() {
    return LookCalendar.looks(pairing).stream()
        .limit(MOST_DATES)
        .map(months -> wording.date(Wording.after(today, months)))
        .collect(Collectors.joining("  ·  "));
  }

  private List<String> said(List<Note> notes) {
    return notes.stream().map(wording::say).toList();
  }

  private static PdfPTable table(int columns) {
    PdfPTable table = new PdfPTable(columns);
    table.setWidthPercentage(100);
    return table;
  }
}
