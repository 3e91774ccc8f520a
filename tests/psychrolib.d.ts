/** The parts that a test uses; the package brings no types. */
declare module 'psychrolib' {
  const psychrolib: {
    SI: unknown;
    SetUnitSystem(system: unknown): void;
    /** Pa at an altitude in m. */
    GetStandardAtmPressure(altitude: number): number;
    /** m3 per kg of dry air, from °C, kg/kg and Pa. */
    GetMoistAirVolume(temperature: number, humidityRatio: number, pressure: number): number;
  };
  export default psychrolib;
}
