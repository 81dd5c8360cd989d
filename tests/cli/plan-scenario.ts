/** The scenario that the design of the engine shows, as JSON. */
export const designScenario = {
  pool: {
    volume: 75.7,
    meanDepth: 1.5,
    surface: 'plaster',
    latitude: 28,
    longitude: -81.5,
    timeZone: 'America/New_York',
    sunExposure: 1,
    cover: 'none',
    waterFeatures: false,
    fillWater: { calciumHardness: 60, totalAlkalinity: 80, pH: 7.6 },
    pump: [{ from: '08:00', to: '16:00' }],
    feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 8, loaded: 0 },
    swimHours: { from: '10:00', to: '20:00' },
    stabilizerBand: [30, 60],
    swimLimit: 4,
  },
  reading: {
    takenAt: '2026-07-05T19:00:00-04:00',
    method: 'drop-kit',
    freeChlorine: 3,
    combinedChlorine: 0.2,
    pH: 7.5,
    totalAlkalinity: 80,
    calciumHardness: 220,
    cyanuricAcid: 50,
    temperature: 29,
  },
  shelf: [
    { id: 'tabs', form: 'tablet', substance: 'trichlor', strength: 90, tabletMass: 227, pricePerKg: 9, stock: 5000 },
    {
      ...{ id: 'gran', form: 'granular', substance: 'calcium-hypochlorite', strength: 65, labelWay: 'dissolve' },
      ...{ measure: 50, pricePerKg: 7.5, stock: 4000 },
    },
    {
      ...{ id: 'liq', form: 'liquid', substance: 'sodium-hypochlorite', strength: 12.5, boughtOn: '2026-06-20' },
      ...{ storedAt: 28, measure: 250, pricePerLitre: 1.6, stock: 20000 },
    },
  ],
  week: { rain: [0, 0, 12, 0, 0, 0, 0], swimmerHours: [0, 0, 0, 0, 0, 0, 8] },
};
