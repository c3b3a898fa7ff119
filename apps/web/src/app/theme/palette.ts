/** One look of the product; every colour on screen and in print comes from here. */
export interface Palette {
  /** Grounds, from the page itself to what stands out most on it. */
  ground: { page: string; panel: string; muted: string; raised: string; inverted: string };
  /** Writing: graphite ink, and two quieter grades. */
  ink: { plain: string; muted: string; quiet: string; inverted: string; error: string };
  /** Hairlines that only divide, and the edge of a control, which must be seen. */
  line: { hair: string; firm: string; control: string };
  /** Blued steel, the one accent. */
  steel: { solid: string; onSolid: string; text: string; wash: string; washStrong: string };
  /** The dryness ramp; its steps differ in lightness, so they stay apart without colour. */
  dryness: { fresh: string; turning: string; dry: string };
}

export const light: Palette = {
  ground: { page: '#FBF8F1', panel: '#FFFEFA', muted: '#F3EEE2', raised: '#E8E0CF', inverted: '#24272B' },
  ink: { plain: '#24272B', muted: '#55585C', quiet: '#606366', inverted: '#FBF8F1', error: '#93330F' },
  line: { hair: '#E2DACA', firm: '#CFC6B3', control: '#857D6D' },
  steel: { solid: '#2B4A72', onSolid: '#FFFFFF', text: '#2B4A72', wash: '#E9EDF1', washStrong: '#D5DEE8' },
  dryness: { fresh: '#0B4244', turning: '#CFAB66', dry: '#A94B1D' },
};

export const dark: Palette = {
  ground: { page: '#1B1C1E', panel: '#232528', muted: '#2B2D30', raised: '#393B3E', inverted: '#EFEAE0' },
  ink: { plain: '#EFEAE0', muted: '#BDB9AF', quiet: '#A9A59C', inverted: '#1B1C1E', error: '#F0A27E' },
  line: { hair: '#36383B', firm: '#4A4C50', control: '#8B8881' },
  steel: { solid: '#A9C4E2', onSolid: '#16202C', text: '#A9C4E2', wash: '#28323D', washStrong: '#34424F' },
  dryness: { fresh: '#2B7F7D', turning: '#EBD6A8', dry: '#E09063' },
};
