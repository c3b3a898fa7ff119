import { ChoiceTiles } from '../../components/fields/choice-tiles';

/** The steps that are common on drop-in gauges, % (common practice, no source). */
const STEPS = ['0.5', '0.75', '1.0'];
const options = STEPS.map((label) => ({ value: String(Number(label)), label: `${label} %` }));

/** What goes in and what does not. */
export function StepFields() {
  return (
    <>
      <ChoiceTiles
        name="goes"
        label="The largest step that goes in"
        options={[{ value: '', label: 'None' }, ...options]}
        minTileWidth="3.75rem"
      />
      <ChoiceTiles
        name="stops"
        label="The smallest step that does not"
        options={[...options, { value: '', label: 'All go in' }]}
        minTileWidth="3.75rem"
      />
    </>
  );
}
