import type { Palette } from './palette';
import { dark, light } from './palette';

const both = (pick: (palette: Palette) => string) => ({ value: { base: pick(light), _dark: pick(dark) } });

/** Chakra's names for grounds, writing and lines, filled from the palette. */
const base = {
  bg: {
    DEFAULT: both((p) => p.ground.page),
    subtle: both((p) => p.ground.muted),
    muted: both((p) => p.ground.muted),
    emphasized: both((p) => p.ground.raised),
    inverted: both((p) => p.ground.inverted),
    panel: both((p) => p.ground.panel),
    error: both((p) => p.ground.muted),
  },
  fg: {
    DEFAULT: both((p) => p.ink.plain),
    muted: both((p) => p.ink.muted),
    subtle: both((p) => p.ink.quiet),
    inverted: both((p) => p.ink.inverted),
    error: both((p) => p.ink.error),
  },
  border: {
    DEFAULT: both((p) => p.line.hair),
    muted: both((p) => p.line.hair),
    subtle: both((p) => p.line.hair),
    emphasized: both((p) => p.line.firm),
    inverted: both((p) => p.ground.inverted),
    /** The edge of something one can press or fill in. */
    control: both((p) => p.line.control),
    error: both((p) => p.ink.error),
  },
};

const steel = {
  solid: both((p) => p.steel.solid),
  contrast: both((p) => p.steel.onSolid),
  fg: both((p) => p.steel.text),
  subtle: both((p) => p.steel.wash),
  muted: both((p) => p.steel.washStrong),
  emphasized: both((p) => p.steel.washStrong),
  focusRing: both((p) => p.steel.solid),
  border: both((p) => p.line.control),
};

/** `colorPalette="ink"`: quiet buttons and menus. */
const ink = {
  solid: both((p) => p.ground.inverted),
  contrast: both((p) => p.ink.inverted),
  fg: both((p) => p.ink.plain),
  subtle: both((p) => p.ground.muted),
  muted: both((p) => p.ground.raised),
  emphasized: both((p) => p.ground.raised),
  focusRing: both((p) => p.steel.solid),
  border: both((p) => p.line.control),
};

/** `colorPalette="rust"`: what can't be taken back. */
const rust = {
  ...ink,
  solid: both((p) => p.ink.error),
  contrast: both((p) => p.ground.page),
  fg: both((p) => p.ink.error),
};

const dryness = {
  fresh: both((p) => p.dryness.fresh),
  turning: both((p) => p.dryness.turning),
  dry: both((p) => p.dryness.dry),
};

export const semanticColors = { ...base, steel, ink, rust, dryness };
