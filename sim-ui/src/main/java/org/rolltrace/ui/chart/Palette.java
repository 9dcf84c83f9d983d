package org.rolltrace.ui.chart;

import java.util.Map;

/**
 * The colours of all inks.
 *
 * @param name what it is called
 * @param colours red, green and blue as 0xRRGGBB, of every ink
 */
public record Palette(String name, Map<Ink, Integer> colours) {

  /** Dark ink on neutral paper. */
  public static final Palette LIGHT =
      new Palette(
          "light",
          Map.ofEntries(
              Map.entry(Ink.GROUND, 0xF7F6F3),
              Map.entry(Ink.PANEL, 0xFFFFFF),
              Map.entry(Ink.TEXT, 0x23272B),
              Map.entry(Ink.QUIET, 0x62686E),
              Map.entry(Ink.GRID, 0xE2E1DC),
              Map.entry(Ink.AXIS, 0xA9ABAA),
              Map.entry(Ink.RIGHT, 0x0072B2),
              Map.entry(Ink.LEFT, 0xD55E00),
              Map.entry(Ink.SECOND, 0x009E73),
              Map.entry(Ink.THIRD, 0xCC79A7),
              Map.entry(Ink.FOURTH, 0xE69F00),
              Map.entry(Ink.FIFTH, 0x56B4E9),
              Map.entry(Ink.CURSOR, 0x23272B),
              Map.entry(Ink.MARKER, 0x6B7076),
              Map.entry(Ink.WING, 0x3F464C),
              Map.entry(Ink.LIMIT, 0x4A4F54)));

  /** Light ink on slate; the data colours a little lighter, to keep their contrast. */
  public static final Palette SLATE =
      new Palette(
          "slate",
          Map.ofEntries(
              Map.entry(Ink.GROUND, 0x22282E),
              Map.entry(Ink.PANEL, 0x2B3238),
              Map.entry(Ink.TEXT, 0xE8EAEB),
              Map.entry(Ink.QUIET, 0xA7AEB4),
              Map.entry(Ink.GRID, 0x363E45),
              Map.entry(Ink.AXIS, 0x6C757D),
              Map.entry(Ink.RIGHT, 0x4BA3DB),
              Map.entry(Ink.LEFT, 0xF08A3C),
              Map.entry(Ink.SECOND, 0x2FC39A),
              Map.entry(Ink.THIRD, 0xDE97BF),
              Map.entry(Ink.FOURTH, 0xF0B93A),
              Map.entry(Ink.FIFTH, 0x8CCBF2),
              Map.entry(Ink.CURSOR, 0xF4F5F5),
              Map.entry(Ink.MARKER, 0x9AA2A9),
              Map.entry(Ink.WING, 0xC9CFD4),
              Map.entry(Ink.LIMIT, 0xB4BABF)));

  /** For paper: white ground, and a right and left ink that differ in grey as well. */
  public static final Palette PRINT =
      new Palette(
          "print",
          Map.ofEntries(
              Map.entry(Ink.GROUND, 0xFFFFFF),
              Map.entry(Ink.PANEL, 0xFFFFFF),
              Map.entry(Ink.TEXT, 0x16181A),
              Map.entry(Ink.QUIET, 0x54595E),
              Map.entry(Ink.GRID, 0xE3E3E3),
              Map.entry(Ink.AXIS, 0x9C9C9C),
              Map.entry(Ink.RIGHT, 0x0072B2),
              Map.entry(Ink.LEFT, 0xD55E00),
              Map.entry(Ink.SECOND, 0x009E73),
              Map.entry(Ink.THIRD, 0xCC79A7),
              Map.entry(Ink.FOURTH, 0xE69F00),
              Map.entry(Ink.FIFTH, 0x56B4E9),
              Map.entry(Ink.CURSOR, 0x16181A),
              Map.entry(Ink.MARKER, 0x5E6368),
              Map.entry(Ink.WING, 0x34393E),
              Map.entry(Ink.LIMIT, 0x3C4146)));

  public Palette {
    colours = Map.copyOf(colours);
    for (Ink ink : Ink.values()) {
      if (!colours.containsKey(ink)) {
        throw new IllegalArgumentException(
            "palette " + name + " has no colour for " + ink + "; expected one for every ink");
      }
    }
  }

  /**
   * The colour of an ink.
   *
   * @param ink the role
   * @return red, green and blue as 0xRRGGBB
   */
  public int rgb(Ink ink) {
    return colours.get(ink);
  }
}
