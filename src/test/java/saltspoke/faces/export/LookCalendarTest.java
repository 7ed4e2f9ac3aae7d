package saltspoke.faces.export;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.StringReader;
import java.nio.charset.StandardCharsets;
import java.time.LocalDate;
import java.util.List;
import net.fortuna.ical4j.data.CalendarBuilder;
import net.fortuna.ical4j.model.Calendar;
import net.fortuna.ical4j.model.Component;
import net.fortuna.ical4j.model.component.VEvent;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import saltspoke.faces.Texts;

class LookCalendarTest {
  private static final LocalDate TODAY = LocalDate.of(2026, 12, 1);

  @Test
  @Tag("law")
  void aLibraryReadsBackEveryLookAndTheReplacement() throws Exception {
    String text = LookCalendar.render(SampleAdvice.at("Łódź; Mitte, Nord"), Texts.in("de"), TODAY);
    Calendar calendar = new CalendarBuilder().build(new StringReader(text));
    calendar.validate();
    List<VEvent> events = calendar.getComponents(Component.VEVENT);

    // Looks at 2.7, 4.9, … 15.9 months lie before the replacement at 17: seven, and that itself.
    assertEquals(8, events.size());
    assertEquals("20270221", events.get(0).getDateTimeStart().getValue(), "82 days on");
    assertEquals("Łódź; Mitte, Nord, Łódzkie, Polen", events.get(0).getLocation().getValue());
    assertEquals(
        events.size(),
        events.stream().map(event -> event.getUid().orElseThrow().getValue()).distinct().count());
  }

  @Test
  @Tag("law")
  void noLineIsLongerThanTheStandardAllowsAndAllEndInCrLf() {
    String text = LookCalendar.render(SampleAdvice.at("Łódź".repeat(40)), Texts.in("fr"), TODAY);
    assertTrue(text.endsWith("END:VCALENDAR\r\n"));
    assertEquals(
        text.length(),
        text.replace("\r\n", "").replace("\n", "").length() + 2 * text.split("\r\n", -1).length - 2,
        "no bare line ends");
    for (String line : text.split("\r\n")) {
      assertTrue(line.getBytes(StandardCharsets.UTF_8).length <= 75, line);
    }
  }

  @Test
  @Tag("regression")
  void theSameQuestionOnTheSameDayGivesTheSameFile() {
    assertEquals(
        LookCalendar.render(SampleAdvice.at("Łódź"), Texts.in("en"), TODAY),
        LookCalendar.render(SampleAdvice.at("Łódź"), Texts.in("en"), TODAY));
  }
}
