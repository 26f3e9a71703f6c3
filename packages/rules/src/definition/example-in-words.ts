import { MEASURES, type MeasureName } from '../measures/catalogue';
import type { Example } from './satisfy';

/**
 * Values in words, for a message to whoever writes a rule: "depthM is 30 m and inversionSure is true".
 *
 * Units: each measure's, written behind the number. Valid: any example. Source: none (definition).
 */
export function exampleInWords(example: Example): string {
  const parts = Object.entries(example).map(([name, value]) => {
    const { kind, unit } = MEASURES[name as MeasureName];
    const said = kind === 'yes-no' ? String(value === 1) : `${Number(value.toFixed(3))}${unit && ` ${unit}`}`;
    return `${name} is ${said}`;
  });
  return parts.join(' and ');
}
