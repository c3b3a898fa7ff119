import { colorModes, setColorMode, useColorMode } from '../../app/color-mode';
import { colorModeWords } from '../../app/color-mode-words';
import { Tiles } from '../../components/fields/tiles';

const options = colorModes.map((value) => ({ value, label: colorModeWords[value] }));

/** Light or dark; kept on this device. */
export function LookSettings() {
  const mode = useColorMode();
  return (
    <Tiles name="look" label="Look on this device" options={options} value={mode} onChange={setColorMode} />
  );
}
