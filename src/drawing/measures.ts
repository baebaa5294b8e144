/**
 * Sizes of every figure, in CSS pixels at natural size, most of them as shares of the drawn bond length.
 * With these a figure of full width (`MAXIMUM_WIDTH`) still has 8 px type on a 320 px screen and 6 pt type when
 * printed 80 mm wide.
 */
export const BOND = 42;

/** Bond length of flat diagrams. */
export const FLAT_BOND = 36;

/** Pixels per ångström: the C–C bond of cyclohexane, 1.536 Å, is one bond length. */
export const SCALE = BOND / 1.536;

export const BACK_STROKE = 0.035 * BOND;
export const FRONT_STROKE = 0.075 * BOND;
export const BOND_STROKE = 0.038 * BOND;
/** Between the two lines of a double bond. */
export const DOUBLE_GAP = 0.1 * BOND;
export const HAIRLINE = 0.75;

/** Free space on either side of a nearer bond where it crosses a farther one. */
export const CROSSING_GAP = 0.05 * BOND;
/** Between the end of a bond and the letters it points at. */
export const LABEL_GAP = 0.08 * BOND;

/** Group labels: capitals are 0.66 of the type size high, a quarter of a bond. */
export const LABEL_SIZE = 16;
export const SMALL_SIZE = 13;
export const TEXT_SIZE = 14;

/** Heights of the letters as shares of the type size. */
export const CAP_HEIGHT = 0.66;
export const ASCENDER = 0.72;
export const DESCENDER = 0.21;
export const LINE_HEIGHT = 1.3;

/** Between the chairs of a conformer and its words. */
export const WORD_GAP = 14;

/** Free margin around a figure. */
export const MARGIN = 6;
/** Figures are broken into rows rather than drawn wider than this. */
export const MAXIMUM_WIDTH = 480;
/** More conformers than this are told in words. */
export const MOST_DRAWN = 8;
/** Curves in one plot; more cannot be told apart. */
export const MOST_CURVES = 6;
