import { chakra, Flex, Text } from '@chakra-ui/react';
import { useId } from 'react';
import { percent } from '../../app/figures';
import { StateWord } from '../state-word';
import { drynessOf, drynessWords, rampColour } from './dryness';
import { filledTo, PITCH, platePath, ROLLER, ROLLERS, rollerX } from './link-shape';

interface LinkStripProps {
  /** Share of the treatment used: 0 new, 1 used up; drawn to 1.3. */
  share: number;
  /** The chain it belongs to, for those who hear the page. */
  label?: string;
  /** Without the line of words below, where they stand elsewhere. */
  bare?: boolean;
  /** An ornament, not a statement. */
  decorative?: boolean;
}

const MIDDLE = 26;
const rollers = Array.from({ length: ROLLERS }, (_, i) => i);
const Drawing = chakra('svg', {
  base: { display: 'block', width: 'full', maxWidth: '34rem', height: 'auto', overflow: 'visible' },
});

function Plates({ outer }: { outer: boolean }) {
  return rollers
    .filter((i) => i < ROLLERS - 1 && (i % 2 === 0) === outer)
    .map((i) => (
      <path
        key={i}
        d={platePath(rollerX(i), rollerX(i + 1), MIDDLE)}
        fill={outer ? 'var(--hp-colors-bg-panel)' : 'var(--hp-colors-bg-emphasized)'}
        stroke="var(--hp-colors-border-control)"
        strokeWidth="1.5"
      />
    ));
}

/** A row of half-inch links, each roller a tenth of the treatment, filled as it is used up; the notch marks its end. */
export function LinkStrip({ share, label, bare = false, decorative = false }: LinkStripProps) {
  const id = useId();
  const word = drynessWords[drynessOf(share)];
  const end = rollerX(9.5);
  const text = `${word}, ${percent(share)} of the treatment used`;
  const name = decorative
    ? { 'aria-hidden': true }
    : { role: 'img', 'aria-label': label ? `${label}: ${text}` : text };
  return (
    <div>
      <Drawing viewBox={`0 0 ${ROLLERS * PITCH} ${2 * MIDDLE}`} {...name}>
        <Plates outer={false} />
        <Plates outer />
        <clipPath id={id}>
          <rect
            x="0"
            y="0"
            height={2 * MIDDLE}
            style={{ width: filledTo(share), transition: 'width 700ms' }}
          />
        </clipPath>
        {rollers.map((i) => (
          <circle key={i} cx={rollerX(i)} cy={MIDDLE} r={ROLLER} fill="var(--hp-colors-bg)" />
        ))}
        <g clipPath={`url(#${id})`}>
          {rollers.map((i) => (
            <circle key={i} cx={rollerX(i)} cy={MIDDLE} r={ROLLER} fill={rampColour((i + 0.5) / 10)} />
          ))}
        </g>
        {rollers.map((i) => (
          <circle
            key={i}
            cx={rollerX(i)}
            cy={MIDDLE}
            r={ROLLER}
            fill="none"
            stroke="var(--hp-colors-fg)"
            strokeWidth="1.75"
          />
        ))}
        <path d={`M${end - 5} 1h10l-5 8zM${end - 5} 51h10l-5-8z`} fill="var(--hp-colors-fg)" />
      </Drawing>
      {!bare && !decorative && (
        <Flex gap="3" mt="2" align="center" wrap="wrap">
          <StateWord dryness={drynessOf(share)} />
          <Text color="fg.muted">{percent(share)} of the treatment used</Text>
        </Flex>
      )}
    </div>
  );
}
