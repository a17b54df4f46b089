package perveance.plot;

import java.awt.Color;

/**
 * Colours of a drawing. Meaning never rests on colour alone.
 *
 * @param paper background
 * @param ink text and main lines
 * @param soft secondary text
 * @param faint grid lines
 * @param accent the operating point and what follows the hand
 * @param limit limits and cautions
 * @param shade regions, for example the samples of a histogram
 * @param print true when it goes to paper: heavier lines, no reliance on grey
 */
public record Look(
    Color paper,
    Color ink,
    Color soft,
    Color faint,
    Color accent,
    Color limit,
    Color shade,
    boolean print) {
  /** Black on white, survives a photocopier. */
  public static final Look PAPER =
      new Look(
          Color.WHITE,
          Color.BLACK,
          new Color(0x40, 0x40, 0x40),
          new Color(0xc8, 0xc8, 0xc8),
          Color.BLACK,
          Color.BLACK,
          new Color(0xee, 0xee, 0xee),
          true);

  /** The window by day. */
  public static final Look LIGHT =
      new Look(
          Color.WHITE,
          new Color(0x1d, 0x23, 0x27),
          new Color(0x5c, 0x66, 0x6d),
          new Color(0xe3, 0xe7, 0xe9),
          new Color(0x0a, 0x6b, 0x73),
          new Color(0xb3, 0x1b, 0x1b),
          new Color(0xdc, 0xec, 0xee),
          false);

  /** The window by night. */
  public static final Look DARK =
      new Look(
          new Color(0x17, 0x1b, 0x1e),
          new Color(0xe8, 0xec, 0xee),
          new Color(0xa3, 0xad, 0xb3),
          new Color(0x33, 0x3a, 0x3f),
          new Color(0x4c, 0xc2, 0xcb),
          new Color(0xff, 0x8a, 0x80),
          new Color(0x1c, 0x46, 0x4b),
          false);
}
