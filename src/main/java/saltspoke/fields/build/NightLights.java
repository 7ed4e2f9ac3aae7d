package saltspoke.fields.build;

import java.io.IOException;
import java.util.List;
import java.util.Optional;
import saltspoke.sources.GreyImage;
import saltspoke.sources.LayerBuilder;
import saltspoke.sources.LayerFile;
import saltspoke.sources.LayerSink;
import saltspoke.sources.SourcePackages;

/** Brightness of the earth at night, as a stand-in for people and industry. */
final class NightLights implements LayerBuilder {
  private static final String PACKAGE = "marble-qt-data";

  @Override
  public String id() {
    return "night lights";
  }

  @Override
  public List<String> needs() {
    return List.of(PACKAGE);
  }

  @Override
  public Optional<String> fallBack() {
    return Optional.of("the setting of a place is then guessed from population alone");
  }

  @Override
  public void build(SourcePackages in, LayerSink out) throws IOException {
    GreyImage image = GreyImage.read(in.open(PACKAGE, "citylights.jpg"), "citylights.jpg");
    double stepDeg = 360.0 / image.columns();
    Sheet picture =
        Sheet.world(
            90 - stepDeg / 2,
            -stepDeg,
            -180 + stepDeg / 2,
            stepDeg,
            image.rows(),
            image.columns(),
            image.brightness());
    RasterLayer.write(
        out,
        new LayerFile(
            "night-lights",
            "lights/night-lights.tif",
            "Brightness of the earth at night, 0 to 255, 0.27°",
            "1",
            "1994–1995",
            List.of("brightness"),
            "public domain (NASA and NOAA)",
            "Earth at night: Marc Imhoff of NASA GSFC; Christopher Elvidge of NOAA NGDC; Craig"
                + " Mayhew and Robert Simmon, NASA GSFC",
            "Luma of the picture, mean of 2 × 2 picture points; dark land and sea are not zero."),
        List.of(picture.blockMean(2).roundTo(1)));
  }
}
