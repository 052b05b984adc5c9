declare module 'psychrolib' {
  interface Psychrometrics {
    readonly SI: unknown
    SetUnitSystem(system: unknown): void
    GetSatVapPres(temperatureC: number): number
    GetHumRatioFromVapPres(vapourPa: number, pressurePa: number): number
    GetDryAirDensity(temperatureC: number, pressurePa: number): number
    GetMoistAirVolume(temperatureC: number, humidityRatio: number, pressurePa: number): number
  }
  const psychrolib: Psychrometrics
  export default psychrolib
}
