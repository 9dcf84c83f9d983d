package org.rolltrace.ui.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.awt.image.BufferedImage;
import java.io.ByteArrayInputStream;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.StringReader;
import java.io.StringWriter;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.rolltrace.core.run.RunResult;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;

/** The files, read by the XML and picture readers of the Java runtime. */
class PaintersTest {
  @TempDir Path folder;

  static List<Palette> palettes() {
    return List.of(Palette.LIGHT, Palette.SLATE, Palette.PRINT);
  }

  private static Document xml(String text) throws Exception {
    DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
    factory.setNamespaceAware(true);
    return factory.newDocumentBuilder().parse(new InputSource(new StringReader(text)));
  }

  private static String svg(Sheet sheet) throws IOException {
    StringWriter out = new StringWriter();
    SvgPainter.write(sheet, Palette.PRINT, out);
    return out.toString();
  }

  private static BufferedImage png(Sheet sheet, Palette palette, double scale) throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    PngPainter.write(sheet, palette, scale, out);
    return ImageIO.read(new ByteArrayInputStream(out.toByteArray()));
  }

  private static Sheet small(Mark... marks) {
    return new Sheet(40, 20, List.of(marks));
  }

  @Test
  void svgIsXmlWithEveryLabel() throws Exception {
    Sheet page = StagePicture.draw(Runs.of("tarnlark-full-stick-left"), Optional.empty());
    Document document = xml(svg(page));
    Element root = document.getDocumentElement();
    assertThat(root.getNamespaceURI()).isEqualTo("http://www.w3.org/2000/svg");
    assertThat(root.getAttribute("width")).isEqualTo("1100");
    assertThat(root.getAttribute("height")).isEqualTo("900");
    NodeList texts = document.getElementsByTagName("text");
    List<Mark.Label> labels = Runs.all(Mark.Label.class, page);
    assertThat(texts.getLength()).isEqualTo(labels.size());
    for (int i = 0; i < labels.size(); i++) {
      assertThat(texts.item(i).getTextContent()).isEqualTo(labels.get(i).text());
    }
    assertThat(document.getElementsByTagName("polyline").getLength())
        .isEqualTo(Runs.all(Mark.Polyline.class, page).size());
    assertThat(svg(page)).doesNotContain("NaN").doesNotContain("Infinity");
  }

  @Test
  void textIsEscapedAndWhatXmlCannotHoldIsReplaced() throws Exception {
    String text = "a < b && c > \"d\" ' \u2212 φ \uD83D\uDE80 \u0001 \uD800 \uFFFF";
    Document document =
        xml(svg(small(new Mark.Label(1, 2, text, Anchor.START, TypeSize.SMALL, Ink.TEXT))));
    assertThat(document.getElementsByTagName("text").item(0).getTextContent())
        .isEqualTo("a < b && c > \"d\" ' \u2212 φ \uD83D\uDE80 \uFFFD \uFFFD \uFFFD");
  }

  @Test
  void svgNumbersAreToAHundredth() throws Exception {
    assertThat(svg(small(new Mark.Line(-0.004, 1.005, -12.3, 7.999, Stroke.of(Ink.AXIS, 1.25)))))
        .contains("x1=\"0\"")
        .contains("x2=\"-12.3\"")
        .contains("y2=\"8\"")
        .contains("stroke-width=\"1.25\"");
  }

  @ParameterizedTest
  @MethodSource("palettes")
  void pngHasTheSizeAndShowsSomething(Palette palette) throws IOException {
    BufferedImage image = png(StagePicture.draw(Runs.step(0.3), Optional.empty()), palette, 0.5);
    assertThat(image.getWidth()).isEqualTo(550);
    assertThat(image.getHeight()).isEqualTo(450);
    Set<Integer> colours = new HashSet<>();
    int ground = 0;
    for (int x = 0; x < image.getWidth(); x++) {
      for (int y = 0; y < image.getHeight(); y++) {
        int rgb = image.getRGB(x, y) & 0xFFFFFF;
        colours.add(rgb);
        ground += rgb == palette.rgb(Ink.GROUND) ? 1 : 0;
      }
    }
    assertThat(colours).hasSizeGreaterThan(50);
    // A calm sheet: most of it is ground, and some of it is not.
    assertThat(ground / (550.0 * 450)).isBetween(0.5, 0.97);
  }

  @Test
  void marksLandWhereTheySay() throws IOException {
    double[] x = {10, 20, 20, 10};
    double[] y = {5, 5, 15, 15};
    BufferedImage image =
        png(
            small(
                new Mark.Area(x, y, Ink.RIGHT, 1),
                new Mark.Clip(
                    30, 0, 5, 20, List.of(new Mark.Line(0, 18, 40, 18, Stroke.of(Ink.LEFT, 2))))),
            Palette.PRINT,
            1);
    assertThat(image.getRGB(15, 10) & 0xFFFFFF).isEqualTo(Palette.PRINT.rgb(Ink.RIGHT));
    assertThat(image.getRGB(5, 10) & 0xFFFFFF).isEqualTo(0xFFFFFF);
    assertThat(image.getRGB(32, 18) & 0xFFFFFF).isEqualTo(Palette.PRINT.rgb(Ink.LEFT));
    assertThat(image.getRGB(25, 18) & 0xFFFFFF).isEqualTo(0xFFFFFF);
    assertThat(image.getRGB(38, 18) & 0xFFFFFF).isEqualTo(0xFFFFFF);
  }

  @Test
  void movedMarksAreTheSameElsewhere() {
    Sheet page = StagePicture.draw(Runs.step(0.3), Optional.empty());
    for (Mark mark : page.marks()) {
      Mark moved = mark.movedBy(3, -2);
      List<Mark> before = Runs.flat(List.of(mark));
      List<Mark> after = Runs.flat(List.of(moved));
      for (int i = 0; i < before.size(); i++) {
        assertThat(after.get(i)).hasSameClassAs(before.get(i));
        assertThat(Runs.coordinates(after.get(i))[0] - Runs.coordinates(before.get(i))[0])
            .isCloseTo(3, within(1e-9));
      }
    }
  }

  /** Contrast by WCAG 2.1, success criteria 1.4.3 (text, 4.5) and 1.4.11 (graphics, 3). */
  @ParameterizedTest
  @MethodSource("palettes")
  void inksStandOutFromTheGround(Palette palette) {
    for (Ink ink : List.of(Ink.TEXT, Ink.QUIET)) {
      assertThat(contrast(palette, ink)).as(ink + "").isGreaterThan(4.5);
    }
    for (Ink ink : List.of(Ink.RIGHT, Ink.LEFT, Ink.CURSOR, Ink.MARKER, Ink.WING, Ink.LIMIT)) {
      assertThat(contrast(palette, ink)).as(ink + "").isGreaterThan(3);
    }
  }

  private static double contrast(Palette palette, Ink ink) {
    double a = luminance(palette.rgb(ink));
    double b = luminance(palette.rgb(Ink.GROUND));
    return (Math.max(a, b) + 0.05) / (Math.min(a, b) + 0.05);
  }

  private static double luminance(int rgb) {
    return 0.2126 * linear(rgb >> 16 & 0xFF)
        + 0.7152 * linear(rgb >> 8 & 0xFF)
        + 0.0722 * linear(rgb & 0xFF);
  }

  private static double linear(int channel) {
    double share = channel / 255.0;
    return share <= 0.03928 ? share / 12.92 : Math.pow((share + 0.055) / 1.055, 2.4);
  }

  @Test
  void aPaletteHasEveryInk() {
    assertThatIllegalArgumentException()
        .isThrownBy(() -> new Palette("thin", Map.of(Ink.GROUND, 0)))
        .withMessageContaining("thin");
  }

  @Test
  void bothFilesAreWritten() throws Exception {
    RunResult run = Runs.step(0.3);
    Path into = folder.resolve("new").resolve("charts");
    assertThat(ChartFiles.write(into, run))
        .containsExactly(into.resolve("stage.svg"), into.resolve("stage.png"));
    BufferedImage image = ImageIO.read(into.resolve("stage.png").toFile());
    assertThat(image.getWidth()).isEqualTo(2200);
    assertThat(image.getHeight()).isEqualTo(1800);
    xml(Files.readString(into.resolve("stage.svg")));
    try (var files = Files.list(into)) {
      assertThat(files).hasSize(2);
    }
  }

  @Test
  void bothFilesOrNone() throws IOException {
    // A folder with something in it stands where the first file belongs, and cannot be replaced.
    Files.createDirectories(folder.resolve("stage.svg").resolve("full"));
    RunResult run = Runs.step(0.3);
    assertThatExceptionOfType(UncheckedIOException.class)
        .isThrownBy(() -> ChartFiles.write(folder, run))
        .withMessageContaining("cannot write the result into " + folder);
    try (var files = Files.list(folder)) {
      assertThat(files).containsExactly(folder.resolve("stage.svg"));
    }
  }
}
