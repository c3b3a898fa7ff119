import type { Surface, Weather } from '@halfpitch/contracts';
import type { LucideIcon } from 'lucide-react';
import {
  CircleQuestionMark,
  CloudFog,
  CloudRain,
  Grip,
  House,
  Mountain,
  Route,
  Sun,
  Waves,
} from 'lucide-react';
import { useEffect } from 'react';
import { useFormContext, useWatch } from 'react-hook-form';
import { ChoiceTiles } from '../../components/fields/choice-tiles';
import { surfaceWords, weatherWords } from '../../components/trade-words';
import { optionsOf } from '../chains/options';

const surfaceIcons: Record<Surface, LucideIcon> = {
  road: Route,
  gravel: Grip,
  mountain: Mountain,
  indoor: House,
};
const weatherIcons: Record<Weather, LucideIcon> = {
  dry: Sun,
  damp: CloudFog,
  wet: CloudRain,
  mud: Waves,
  unknown: CircleQuestionMark,
};
const surfaces = optionsOf(surfaceWords).map((option) => ({ ...option, icon: surfaceIcons[option.value] }));
const weathers = optionsOf(weatherWords).map((option) => ({ ...option, icon: weatherIcons[option.value] }));

/** What was ridden on and in which weather: one tap each; indoors it is dry. */
export function GroundTiles() {
  const { setValue } = useFormContext();
  const indoors = (useWatch({ name: 'surface' }) as Surface | undefined) === 'indoor';
  useEffect(() => {
    if (indoors) setValue('weather', 'dry');
  }, [indoors, setValue]);
  return (
    <>
      <ChoiceTiles name="surface" label="Ground" options={surfaces} minTileWidth="4.75rem" />
      {!indoors && <ChoiceTiles name="weather" label="Weather" options={weathers} minTileWidth="3.75rem" />}
    </>
  );
}
