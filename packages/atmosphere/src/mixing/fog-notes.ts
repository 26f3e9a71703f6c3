import { iceFromWaterHumidityPercent } from '../humidity';

/** Notes for the forecaster on fog; the screens word them. */
export type FogNote = 'near saturation over water' | 'freezing fog or rime possible' | 'ice fog possible';

/** What may be set about fog notes. */
export interface FogSettings {
  /** Humidity over water from which air counts as near saturation, %, before its σ is taken off. */
  readonly nearSaturationPercent: number;
  /** Ask for ice fog at all: a setting of the site. */
  readonly iceFog: boolean;
  readonly iceFogBelowC: number;
  /** Humidity over ice from which ice fog is noted, %. */
  readonly iceFogFromIceHumidityPercent: number;
}

/** Near saturation from 97 %; ice fog, where asked for, below −30 °C from 95 % over ice. Common practice. */
export const DEFAULT_FOG_SETTINGS: FogSettings = {
  nearSaturationPercent: 97,
  iceFog: false,
  iceFogBelowC: -30,
  iceFogFromIceHumidityPercent: 95,
};

/**
 * Notes on fog from temperature and relative humidity; no forecast of visibility.
 *
 * Units: °C, % over water. Valid: null where temperature or humidity is missing (it is not "no fog"); an unknown σ
 * counts as 0. Source: [AMSGlossary] freezing fog, ice fog; bounds are common practice.
 */
export function fogNotes(
  temperatureC: number | null,
  relativeHumidityPercent: number | null,
  sigmaPercent = 0,
  settings: Partial<FogSettings> = {},
): readonly FogNote[] | null {
  if (temperatureC === null || relativeHumidityPercent === null) return null;
  if (!Number.isFinite(temperatureC) || !Number.isFinite(relativeHumidityPercent)) return null;
  const used = { ...DEFAULT_FOG_SETTINGS, ...settings };
  const notes: FogNote[] = [];
  if (relativeHumidityPercent >= used.nearSaturationPercent - sigmaPercent) {
    notes.push('near saturation over water');
    if (temperatureC < 0 && temperatureC >= used.iceFogBelowC) notes.push('freezing fog or rime possible');
  }
  const overIce = iceFromWaterHumidityPercent(relativeHumidityPercent, temperatureC);
  if (
    used.iceFog &&
    temperatureC < used.iceFogBelowC &&
    overIce >= used.iceFogFromIceHumidityPercent - sigmaPercent
  ) {
    notes.push('ice fog possible');
  }
  return notes;
}
