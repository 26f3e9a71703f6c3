import { numberMeasure, yesNoMeasure } from './measure';

/** What the towers say of the air's layers. Limits are generous bounds of nature, not of taste. */
export const AIR_MEASURES = {
  inversionStrengthC: numberMeasure('°C', -5, 60, {
    label: { en: 'Inversion', es: 'Inversión' },
    docs:
      'Strength of the surface inversion: temperature at its top less temperature at its base. ' +
      '"At least" when it reaches the top of the tower; 0 when there is none.',
  }),
  strengthWithinTowerC: numberMeasure('°C', -5, 60, {
    label: { en: 'Inversion within the tower', es: 'Inversión dentro de la torre' },
    docs:
      'The part of the surface inversion that the tower itself spans: always a number where the profile is known, ' +
      'so it can be compared between nights.',
  }),
  gradientCPer100m: numberMeasure('°C/100 m', -100, 200, {
    label: { en: 'Temperature gradient', es: 'Gradiente de temperatura' },
    docs: 'Mean rise of temperature with height through the surface inversion, per 100 m; 0 when there is none.',
  }),
  depthM: numberMeasure('m', 0, 3000, {
    label: { en: 'Inversion depth', es: 'Espesor de la inversión' },
    decimals: 0,
    docs: 'Height of the top of the surface inversion less that of its base. "At least" when it reaches the top of the tower.',
  }),
  inversionSure: yesNoMeasure({
    label: { en: 'Inversion sure', es: 'Inversión segura' },
    docs:
      'Whether the surface inversion is beyond what the sensors could mistake: the probability that the top is warmer ' +
      'than the base reaches the setting (0.95 by default).',
  }),
  episodeMinutes: numberMeasure('min', 0, 60 * 24 * 60, {
    label: { en: 'Inversion episode so far', es: 'Episodio de inversión hasta ahora' },
    decimals: 0,
    docs: 'How long the present inversion episode has lasted, by what was known at the time. 0 when none is under way.',
  }),
  stableDepthM: numberMeasure('m', 0, 3000, {
    label: { en: 'Stable depth', es: 'Espesor estable' },
    decimals: 0,
    docs: 'Over how much from the ground up every layer is stable. "At least" when that reaches the top of the tower.',
  }),
  elevatedLid: yesNoMeasure({
    label: { en: 'Lid above the ground', es: 'Inversión elevada' },
    docs: 'Whether the tower shows an elevated inversion that counts (0.3 °C by default, and sure).',
  }),
  elevatedLidBaseM: numberMeasure('m', 0, 3000, {
    label: { en: 'Base of the lid', es: 'Base de la inversión elevada' },
    decimals: 0,
    docs: 'Height above ground of the base of the lowest elevated inversion that counts. Not known when there is none.',
  }),
  elevatedLidStrengthC: numberMeasure('°C', 0, 60, {
    label: { en: 'Strength of the lid', es: 'Intensidad de la inversión elevada' },
    docs: 'Strength of the lowest elevated inversion that counts; 0 when there is none, "at least" when open at the top.',
  }),
  floorToBenchC: numberMeasure('°C', -40, 60, {
    label: { en: 'Bench warmer than floor by', es: 'Ladera más cálida que el fondo en' },
    docs:
      'Temperature of the bench tower less that of the valley-floor tower at the same height above ground: ' +
      'the witness for a lid above the mast.',
  }),
  deltaTClass: numberMeasure('', 1, 7, {
    label: { en: 'Stability class', es: 'Clase de estabilidad' },
    decimals: 0,
    whole: true,
    docs:
      'Class by temperature difference with height for the declared pair of levels (US NRC Regulatory Guide 1.23 Rev. 1): ' +
      '1 is A (extremely unstable) to 7, G (extremely stable).',
  }),
  heatDeficitMJPerM2: numberMeasure('MJ/m²', -5, 60, {
    label: { en: 'Heat deficit', es: 'Déficit de calor' },
    decimals: 2,
    docs:
      'Heat needed to mix the air up to the height set for the tower (its top by default). Masts of unlike height ' +
      'cannot be compared.',
  }),
} as const;
