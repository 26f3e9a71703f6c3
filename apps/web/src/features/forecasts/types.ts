import type { components } from '../../lib/api/schema';

type Shapes = components['schemas'];

export type Forecast = Shapes['Forecast'];
export type ForecastInput = Shapes['ForecastInput'];
export type ForecastSkill = Shapes['ForecastSkill'];
export type ForecastTableResult = Shapes['ForecastTableResult'];
