import { exactly, isKnown, notKnown, type Quantity } from '../bounds';
import { ZERO_CELSIUS_K } from '../constants';
import {
  moistAirFactor,
  saturationVapourPressureIceHPa,
  saturationVapourPressureWaterHPa,
} from '../temperature';
import { absoluteHumidityGPerM3, mixingRatio, specificHumidity, virtualTemperatureK } from './content';
import { dewPointC, frostPointC } from './dew-point';
import { ICE_FORMULA_C, vapourPressureHPa, WATER_FORMULA_C, type MeasuredHumidity } from './vapour-pressure';
import { wetBulbC } from './wet-bulb';

/** Everything that follows from one measurement of humidity; each *not known*, with its reason, outside its range. */
export interface Humidity {
  readonly vapourPressureHPa: Quantity;
  readonly dewPointC: Quantity;
  readonly frostPointC: Quantity;
  readonly overWaterPercent: Quantity;
  readonly overIcePercent: Quantity;
  readonly mixingRatioGPerKg: Quantity;
  readonly specificHumidityGPerKg: Quantity;
  readonly absoluteHumidityGPerM3: Quantity;
  readonly virtualTemperatureC: Quantity;
  readonly wetBulbC: Quantity;
}

const within = (
  temperatureC: number,
  range: { readonly lowest: number; readonly highest: number },
): boolean => temperatureC >= range.lowest && temperatureC <= range.highest;

const finite = (value: number, reason: string): Quantity =>
  Number.isFinite(value) ? exactly(value) : notKnown(reason);

const unknown = (reason: string): Humidity => {
  const nothing = notKnown(reason);
  return {
    vapourPressureHPa: nothing,
    dewPointC: nothing,
    frostPointC: nothing,
    overWaterPercent: nothing,
    overIcePercent: nothing,
    mixingRatioGPerKg: nothing,
    specificHumidityGPerKg: nothing,
    absoluteHumidityGPerM3: nothing,
    virtualTemperatureC: nothing,
    wetBulbC: nothing,
  };
};

/**
 * All humidity quantities from air temperature and any one of relative humidity, dew point or wet bulb.
 *
 * Units: °C, %, hPa in; as each field names out. Valid: each within its formula's range (over water −45 to 60 °C, over
 * ice −65 to 0 °C), else that one is not known with its reason; a missing temperature leaves all not known. A
 * psychrometer measures the vapour pressure in moist air, which is freed of the moist-air factor before it is turned
 * into a dew point or a relative humidity; from humidity or dew point the vapour pressure is that of pure vapour.
 * Source: [WMO8] annex 4.B; [AMSGlossary] mixing ratio, specific humidity, virtual temperature.
 */
export function humidityOf(
  temperatureC: number | null,
  measured: MeasuredHumidity,
  pressureHPa: number,
): Humidity {
  if (temperatureC === null || !Number.isFinite(temperatureC))
    return unknown('the air temperature is not known');
  const vapour = vapourPressureHPa(temperatureC, measured, pressureHPa);
  if (!isKnown(vapour)) return unknown(vapour.reason ?? 'the vapour pressure is not known');
  const e = vapour.lo;
  const factor = moistAirFactor(pressureHPa);
  const pure = measured.kind === 'wet bulb' ? e / factor : e;
  const overWater = (100 * pure) / saturationVapourPressureWaterHPa(temperatureC);
  const overIce = (100 * pure) / saturationVapourPressureIceHPa(temperatureC);
  const ratio = mixingRatio(e, pressureHPa);
  const pressed = 'the pressure is not known';
  return {
    vapourPressureHPa: vapour,
    dewPointC: dewPointC(pure),
    frostPointC: frostPointC(pure),
    overWaterPercent: within(temperatureC, WATER_FORMULA_C)
      ? exactly(overWater)
      : notKnown('air is outside −45 to 60 °C'),
    overIcePercent: within(temperatureC, ICE_FORMULA_C)
      ? exactly(overIce)
      : notKnown('there is no ice above 0 °C'),
    mixingRatioGPerKg: finite(1000 * ratio, pressed),
    specificHumidityGPerKg: finite(1000 * specificHumidity(e, pressureHPa), pressed),
    absoluteHumidityGPerM3: exactly(absoluteHumidityGPerM3(temperatureC, e)),
    virtualTemperatureC: finite(
      virtualTemperatureK(temperatureC + ZERO_CELSIUS_K, ratio) - ZERO_CELSIUS_K,
      pressed,
    ),
    wetBulbC:
      measured.kind === 'wet bulb'
        ? exactly(measured.wetBulbC)
        : wetBulbC(temperatureC, e * factor, pressureHPa),
  };
}
