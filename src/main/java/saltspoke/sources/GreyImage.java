package saltspoke.sources;

import java.awt.image.BufferedImage;
import java.io.IOException;
import java.io.InputStream;
import javax.imageio.ImageIO;
import saltspoke.values.Refusal;

/**
 * A picture as brightness values. JPEG (ITU-T T.81) is decoded by the JDK; colour becomes the luma
 * of ITU-R BT.601-7, 0.299 R + 0.587 G + 0.114 B.
 *
 * @param brightness 0 to 255, row by row from the top
 */
public record GreyImage(int rows, int columns, double[] brightness) {
  /**
   * @param fileName for messages
   * @throws Refusal when it is no picture that the JDK can decode
   */
  public static GreyImage read(InputStream in, String fileName) throws IOException {
    BufferedImage image = ImageIO.read(in);
    if (image == null) {
      throw Refusal.dataDamaged("not-an-image", fileName, "", "a JPEG or PNG picture");
    }
    int columns = image.getWidth();
    int rows = image.getHeight();
    double[] brightness = new double[rows * columns];
    for (int y = 0; y < rows; y++) {
      for (int x = 0; x < columns; x++) {
        int rgb = image.getRGB(x, y);
        brightness[y * columns + x] =
            0.299 * (rgb >> 16 & 255) + 0.587 * (rgb >> 8 & 255) + 0.114 * (rgb & 255);
      }
    }
    return new GreyImage(rows, columns, brightness);
  }
}
