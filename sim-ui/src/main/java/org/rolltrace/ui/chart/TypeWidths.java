package org.rolltrace.ui.chart;

/**
 * How wide texts are, without a font at hand: the advance widths of DejaVu Sans, in thousandths of
 * the em. Another font that takes its place is about as wide or narrower.
 */
final class TypeWidths {
  private static final int FIRST = ' ';
  private static final int[] ASCII = {
    318, 401, 460, 838, 636, 950, 780, 275, 390, 390, 500, 838, 318, 361, 318, 337, 636, 636, 636,
    636, 636, 636, 636, 636, 636, 636, 337, 337, 838, 838, 838, 531, 1000, 684, 686, 698, 770, 632,
    575, 775, 752, 295, 295, 656, 557, 863, 748, 787, 603, 787, 695, 635, 611, 732, 684, 989, 685,
    611, 685, 390, 337, 390, 838, 500, 500, 613, 635, 550, 635, 615, 352, 635, 634, 278, 278, 579,
    278, 974, 634, 612, 635, 635, 411, 521, 392, 634, 592, 818, 592, 592, 525, 636, 337, 636, 838
  };

  /** Of anything else: that of the minus sign, wider than nearly all letters. */
  private static final int OTHER = 838;

  private TypeWidths() {}

  static double of(String text, TypeSize size) {
    int sum = 0;
    for (int i = 0; i < text.length(); i++) {
      int place = text.charAt(i) - FIRST;
      sum +=
          text.charAt(i) == '°' ? 500 : place >= 0 && place < ASCII.length ? ASCII[place] : OTHER;
    }
    return sum * size.pixels() / 1000;
  }
}
