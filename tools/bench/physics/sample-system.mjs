/** An eight-zone system with a towed compressor, so that every figure of a plan is computed. */
export const sampleInput = {
  system: {
    mainLine: [
      { id: 'main-1', material: 'pvc-sdr21', nominalIn: 1.5, lengthFt: 180, ratedPsi: null },
      { id: 'main-2', material: 'pvc-sch40', nominalIn: 1.25, lengthFt: 120, ratedPsi: null },
    ],
    parts: [{ name: 'filter', ratedPsi: 150 }],
    zones: Array.from({ length: 8 }, (_, at) => ({
      id: `zone-${at + 1}`,
      number: at + 1,
      headKind: ['spray', 'rotor', 'rotary-nozzle', 'drip'][at % 4],
      flowGpm: 8 + at,
      designPressurePsi: 30 + 2 * at,
      elevationFt: -4 + 3 * at,
      distanceFt: 60 + 45 * at,
      laterals: [
        {
          id: `lateral-${at}-1`,
          material: at % 3 === 0 ? 'pe-sidr15' : 'pvc-sdr26',
          nominalIn: 1,
          lengthFt: 90 + 10 * at,
          ratedPsi: null,
        },
        { id: `lateral-${at}-2`, material: 'pvc-sch40', nominalIn: 0.75, lengthFt: 60, ratedPsi: null },
      ],
      lowestRatedPart: { name: 'valve', ratedPsi: 125 },
    })),
  },
  equipment: {
    compressor: { freeAirCfm: 110, maxPressurePsi: 100, stages: 1, aftercooler: false },
    hose: { insideDiameterIn: 0.75, lengthFt: 100, couplings: 3 },
  },
  conditions: { altitudeFt: 5280, airTemperatureF: 45 },
  company: { pressureCapPsi: 60 },
};
