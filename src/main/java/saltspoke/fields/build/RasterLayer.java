package saltspoke.fields.build;

import java.io.IOException;
import java.io.OutputStream;
import java.util.List;
import java.util.stream.IntStream;
import saltspoke.fields.FieldStack;
import saltspoke.sources.LayerFile;
import saltspoke.sources.LayerSink;

/** What all raster builders share: labels, and writing a stack of sheets. */
final class RasterLayer {
  /** Band labels of monthly layers. */
  static final List<String> MONTHS =
      IntStream.rangeClosed(1, 12).mapToObj(String::valueOf).toList();

  private RasterLayer() {}

  /** Writes the sheets as the bands of one GeoTIFF. */
  static void write(LayerSink out, LayerFile file, List<Sheet> sheets) throws IOException {
    FieldStack stack =
        new FieldStack(
            file.layer(),
            file.bands(),
            sheets.stream().map(sheet -> sheet.toField(file.unit())).toList());
    String description =
        (file.title()
                + "; unit "
                + file.unit()
                + "; period "
                + file.period()
                + "; bands "
                + String.join(" ", file.bands()))
            .replaceAll("[^\\x20-\\x7e]", "-");
    try (OutputStream bytes = out.file(file)) {
      bytes.write(GeoTiffExport.write(stack, description));
    }
  }
}
