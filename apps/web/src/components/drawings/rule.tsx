import { chakra, Text } from '@chakra-ui/react';
import { elongation } from '../../app/format';
import { BASE, ChainOnRule, Lens, MainScale } from './rule-parts';
import { Slide } from './rule-slide';
import { along, scaleEnd } from './vernier';

interface RuleProps {
  /** Elongation, %. */
  value: number;
  /** Where the chain is replaced, %. */
  limit: number;
  /** Between which the elongation lies with a chance of 80 %. */
  band?: { p10: number; p90: number };
  /** The chain it belongs to, for those who hear the page. */
  label?: string;
  /** Without the line of words below, where they stand elsewhere. */
  bare?: boolean;
}

const Drawing = chakra('svg', {
  base: { display: 'block', width: 'full', maxWidth: '34rem', height: 'auto', overflow: 'visible' },
});

/** What the rule shows, as a sentence. */
export function ruleWords({ value, limit, band }: Pick<RuleProps, 'value' | 'limit' | 'band'>): string {
  const range = band ? ` (between ${elongation(band.p10)} and ${elongation(band.p90)})` : '';
  const place = value >= limit ? 'past its limit of' : 'of the allowed';
  return `${elongation(value)} longer than new${range}, ${place} ${elongation(limit)}`;
}

/** A 12-inch rule on 24 pitches, and its end enlarged to a vernier on which half a percent is plain to see. */
export function Rule({ value, limit, band, label, bare = false }: RuleProps) {
  const end = Math.max(scaleEnd(value), scaleEnd(limit), scaleEnd(band?.p90 ?? 0));
  const words = ruleWords({ value, limit, band });
  const at = along(limit, end);
  const [low, high] = [band?.p10 ?? 0, band?.p90 ?? 0].map((pct) => along(Math.max(0, pct), end)) as [
    number,
    number,
  ];
  return (
    <div>
      <Drawing viewBox="0 0 480 168" role="img" aria-label={label ? `${label}: ${words}` : words}>
        <Lens end={end} />
        <ChainOnRule value={value} />
        {band && (
          <rect
            x={low}
            y={BASE - 16}
            width={Math.max(2, high - low)}
            height="16"
            fill="var(--hp-colors-steel-muted)"
          />
        )}
        <MainScale end={end} limit={limit} />
        <Slide value={value} end={end} />
        <path d={`M${at} ${BASE - 58}V${BASE}`} stroke="var(--hp-colors-dryness-dry)" strokeWidth="3" />
        <text x={at + 6} y={BASE - 45} fontSize="15" fontWeight="600" fill="var(--hp-colors-fg)">
          limit {limit} %
        </text>
      </Drawing>
      {!bare && (
        <Text mt="2" color="fg.muted">
          {words}.
        </Text>
      )}
    </div>
  );
}
