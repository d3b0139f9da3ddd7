package org.archspan.figure;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.awt.geom.Path2D;
import java.awt.geom.PathIterator;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.OptionalDouble;
import javax.imageio.ImageIO;
import javax.imageio.ImageReader;
import javax.imageio.stream.ImageInputStream;
import javax.xml.parsers.DocumentBuilderFactory;
import org.archspan.boundary.Parity;
import org.archspan.spacing.PlaneResult;
import org.archspan.stability.GrowthCurve;
import org.archspan.stability.GrowthPoint;
import org.archspan.units.Constants;
import org.archspan.units.OutputUnits;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;

class FigureTest {
  private static GrowthFigure figure() {
    double k = 2.0 * Math.PI / (1000.0 * Constants.PARSEC);
    GrowthPoint slow = new GrowthPoint(0.5 * k, 1e-16, 1e-9, 1);
    GrowthPoint fast = new GrowthPoint(k, 1e-15, 1e-9, 1);
    return new GrowthFigure(List.of(new GrowthCurve(Parity.MIRROR, 0, 0.0, List.of(slow, fast))), List.of(new GrowthFigure.Mark("fastest", fast)),
        OptionalDouble.of(1.2e-15), OptionalDouble.of(500.0 * Constants.PARSEC), OutputUnits.galactic(),
        FigureStyle.journal());
  }

  @Test
  void svgHasRealTextUnitsAndADescription() throws Exception {
    String svg = FigureImage.svg(figure());
    DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
    factory.setFeature("http://apache.org/xml/features/nonvalidating/load-external-dtd", false);
    Document document = factory.newDocumentBuilder().parse(
        new ByteArrayInputStream(svg.getBytes(StandardCharsets.UTF_8)));
    NodeList texts = document.getElementsByTagName("text");
    StringBuilder all = new StringBuilder();
    for (int i = 0; i < texts.getLength(); i++) {
      all.append(((Element) texts.item(i)).getTextContent()).append('\n');
    }
    assertThat(all.toString()).contains("wavelength along the field (kpc)").contains("growth rate (Myr\u207b\u00b9)");
    assertThat(document.getElementsByTagName("title").item(0).getTextContent()).isEqualTo(
        "Growth rate against wavelength along the field; fastest: 1.00 kpc, growth time 31.7 Myr");
    assertThat(FigureImage.svg(figure())).isEqualTo(svg);
  }

  /** 88 mm at 300 dots an inch are 1039 pixels; the resolution is noted in dots per metre. */
  @Test
  void pngHasJournalWidthAndResolution() throws IOException {
    byte[] png = FigureImage.png(figure());
    assertThat(ImageIO.read(new ByteArrayInputStream(png)).getWidth()).isEqualTo(1039);
    ImageReader reader = ImageIO.getImageReadersByFormatName("png").next();
    try (ImageInputStream stream = ImageIO.createImageInputStream(new ByteArrayInputStream(png))) {
      reader.setInput(stream);
      Element root = (Element) reader.getImageMetadata(0).getAsTree("javax_imageio_png_1.0");
      Element physical = (Element) root.getElementsByTagName("pHYs").item(0);
      assertThat(physical.getAttribute("pixelsPerUnitXAxis")).isEqualTo("11811");
    }
  }

  @Test
  void lightnessCarriesTheValue() {
    double last = -1.0;
    for (int i = 0; i <= 100; i++) {
      double luminance = ColourMap.luminance(ColourMap.SEQUENTIAL.colour(i / 100.0));
      assertThat(luminance).isGreaterThan(last);
      last = luminance;
    }
    double middle = ColourMap.luminance(ColourMap.DIVERGING.colour(0.5));
    for (double away = 0.05; away <= 0.5; away += 0.05) {
      assertThat(ColourMap.luminance(ColourMap.DIVERGING.colour(0.5 - away))).isLessThan(middle);
      assertThat(ColourMap.luminance(ColourMap.DIVERGING.colour(0.5 + away))).isLessThan(middle);
    }
  }

  /** The contours of x^2 + y^2 are circles. */
  @Test
  void contoursFollowTheLevel() {
    int n = 81;
    double[] x = new double[n];
    double[][] value = new double[n][n];
    for (int i = 0; i < n; i++) {
      x[i] = -2.0 + 4.0 * i / (n - 1);
    }
    for (int i = 0; i < n; i++) {
      for (int j = 0; j < n; j++) {
        value[i][j] = x[i] * x[i] + x[j] * x[j];
      }
    }
    Path2D circle = ContourLines.of(x, x, value, 1.0);
    double[] point = new double[6];
    int count = 0;
    for (PathIterator path = circle.getPathIterator(null); !path.isDone(); path.next()) {
      path.currentSegment(point);
      // 2e-3: linear interpolation on a grid of 0.05
      assertThat(Math.hypot(point[0], point[1])).isCloseTo(1.0, within(2e-3));
      count++;
    }
    assertThat(count).isGreaterThan(100);
  }

  /** s^2 = 1 - kx + ky/10: on a grid that knows only the growth rate the margin lies where the closed form has it. */
  @Test
  void theMarginLiesBetweenThePointsOfTheGrid() {
    double[] across = {0.0, 1.0, 2.0, 3.0};
    double[] along = {0.1, 0.3, 0.5, 0.7, 0.9, 1.1, 1.3, 1.5};
    double[][] growth = new double[along.length][across.length];
    for (int i = 0; i < along.length; i++) {
      for (int j = 0; j < across.length; j++) {
        growth[i][j] = Math.sqrt(Math.max(0.0, 1.0 - along[i] + 0.1 * across[j]));
      }
    }
    GrowthSurface surface = new GrowthSurface(across, along, growth);
    for (double ky = 0.0; ky <= 3.0; ky += 0.25) {
      // 1e-12: both are linear there, rounding remains
      assertThat(surface.square(ky, 1.0 + 0.1 * ky)).isCloseTo(0.0, within(1e-12));
    }
    assertThat(surface.square(0.0, 1.4)).isNegative();
  }

  @Test
  void aStablePlaneAndAnEmptyCurveAreDrawnAsStable() {
    double k = 2.0 * Math.PI / (1000.0 * Constants.PARSEC);
    PlaneResult plane = new PlaneResult(new double[] {k, 2.0 * k}, new double[] {0.0, k}, new double[2][2],
        new double[2]);
    assertThat(FigureImage.svg(new PlaneFigure(plane, OutputUnits.galactic(), FigureStyle.journal())))
        .contains(">stable<").doesNotContain("growth rate (");
    assertThat(FigureImage.svg(new GrowthFigure(List.of(), List.of(), OptionalDouble.empty(), OptionalDouble.empty(),
        OutputUnits.galactic(), FigureStyle.journal()))).contains(">nothing grows<");
  }

  @ParameterizedTest
  @CsvSource({"1, 1.00", "1137.2, 1140", "0.99999, 1.00", "59.84, 59.8", "0.012345, 0.0123", "0, 0", "Infinity, \u221e"})
  void namesOfPointsHaveThreeDigitsAndNoExponent(double value, String printed) {
    assertThat(Plots.short3(value)).isEqualTo(printed);
  }

  @Test
  void powersOfTenReadAsPowers() {
    assertThat(DecadeAxis.superscript(-12)).isEqualTo("\u207b\u00b9\u00b2");
  }
}
