package org.archspan.figure;

/** Colour maps whose lightness carries the value, so that they survive grey print. */
enum ColourMap {
  /** From dark blue to pale sand: lightness rises steadily. */
  SEQUENTIAL(new int[] {0x16163F, 0x2A3F7A, 0x2F7390, 0x5FA38A, 0xB4C98B, 0xF6EBB8}),
  /** Blue for less, sand-brown for more, white for none. */
  DIVERGING(new int[] {0x1C3F73, 0x5E8FC0, 0xBCD5E6, 0xF8F8F6, 0xEBCBA4, 0xC4813F, 0x7A3A0E});

  private final int[] stops;

  ColourMap(int[] stops) {
    this.stops = stops;
  }

  /** Colour as 0xRRGGBB at a fraction between 0 and 1, linear between the stops. */
  int colour(double fraction) {
    double at = Math.max(0.0, Math.min(1.0, fraction)) * (stops.length - 1);
    int i = Math.min(stops.length - 2, (int) at);
    double share = at - i;
    int colour = 0;
    for (int shift = 16; shift >= 0; shift -= 8) {
      int low = stops[i] >> shift & 0xFF;
      int high = stops[i + 1] >> shift & 0xFF;
      colour |= (int) Math.round(low + share * (high - low)) << shift;
    }
    return colour;
  }

  /** Relative luminance of a colour, dimensionless, 0 to 1 (Rec. ITU-R BT.709). */
  static double luminance(int colour) {
    return 0.2126 * linear(colour >> 16 & 0xFF) + 0.7152 * linear(colour >> 8 & 0xFF) + 0.0722 * linear(colour & 0xFF);
  }

  private static double linear(int channel) {
    double c = channel / 255.0;
    return c <= 0.04045 ? c / 12.92 : Math.pow((c + 0.055) / 1.055, 2.4);
  }
}
