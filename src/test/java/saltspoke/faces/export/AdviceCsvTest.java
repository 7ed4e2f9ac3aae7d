package saltspoke.faces.export;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.io.StringReader;
import java.util.List;
import org.apache.commons.csv.CSVFormat;
import org.apache.commons.csv.CSVRecord;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;

@Tag("law")
class AdviceCsvTest {
  private static List<CSVRecord> read(String place) throws Exception {
    String csv = AdviceCsv.render(SampleAdvice.at(place));
    CSVFormat format = CSVFormat.RFC4180.builder().setHeader().setSkipHeaderRecord(true).get();
    return format.parse(new StringReader(csv)).getRecords();
  }

  @Test
  void readsBackWhatWentIn() throws Exception {
    List<CSVRecord> rows = read("Łódź, \"Mitte\"");
    assertEquals(2, rows.size());
    assertEquals("Łódź, \"Mitte\"", rows.get(0).get("place"));
    assertEquals("C3", rows.get(0).get("class_carbon_steel"));
    assertEquals("aluminium-anodised-thin", rows.get(0).get("nipple"));
    assertEquals(2.7, Double.parseDouble(rows.get(0).get("first_look_months")), 1e-9);
    assertEquals("", rows.get(0).get("head_loss_p90_months"));
    assertEquals("beyond-240", rows.get(0).get("head_loss_note"));
    assertEquals("", rows.get(1).get("replace_by_months"));
    assertEquals("not-applicable", rows.get(1).get("first_attack_note"));
  }

  @Test
  void noCellStartsAFormula() throws Exception {
    assertEquals("'=1+1", read("=1+1").get(0).get("place"));
  }
}
