import { colorModes, setColorMode, useColorMode } from '../app/color-mode';
import type { ColorMode } from '../app/color-mode';
import { Tiles } from './fields/tiles';

const words: Record<ColorMode, string> = { light: 'Light', dark: 'Dark', system: 'As the device' };
const options = colorModes.map((value) => ({ value, label: words[value] }));

/** Light or dark; kept on this device. */
export function LookTiles() {
  const mode = useColorMode();
  return (
    <Tiles
      minTileWidth="4rem"
      name="look"
      label="Look"
      options={options}
      value={mode}
      onChange={setColorMode}
    />
  );
}
