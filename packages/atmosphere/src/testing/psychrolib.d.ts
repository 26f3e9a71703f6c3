declare module 'psychrolib' {
  interface Psychrolib {
    readonly SI: number;
    SetUnitSystem(system: number): void;
    GetVapPresFromRelHum(temperatureC: number, relativeHumidity: number): number;
    GetTDewPointFromRelHum(temperatureC: number, relativeHumidity: number): number;
    GetTDewPointFromVapPres(temperatureC: number, vapourPressurePa: number): number;
    GetTWetBulbFromRelHum(temperatureC: number, relativeHumidity: number, pressurePa: number): number;
    GetSatVapPres(temperatureC: number): number;
    GetHumRatioFromVapPres(vapourPressurePa: number, pressurePa: number): number;
    GetSpecificHumFromHumRatio(humidityRatio: number): number;
  }
  const psychrolib: Psychrolib;
  export default psychrolib;
}
