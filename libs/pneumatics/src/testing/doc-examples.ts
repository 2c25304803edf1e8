import { absolutePsi, gaugePsi, seaLevelPsia } from '@rimeward/units';
import { compressorDelivery } from '../air-demand/delivery';
import { compressorFit } from '../air-demand/compressor-fit';
import { displacementAir } from '../air-demand/displacement';
import { kgSFromCfm, openHeadsAir } from '../air-demand/open-heads';
import { waterPushed } from '../air-demand/water-pushed';
import { standardAtmosphere } from '../atmosphere/standard-atmosphere';
import { pressureCeiling } from '../ceiling/pressure-ceiling';
import { airCycles } from '../cycles/air-cycles';
import type { HeadKind } from '../cycles/head-kind';
import { storedEnergy } from '../energy/stored-energy';
import type { FormulaId } from '../explain/formulas';
import { hoseBore } from '../loss/air-path';
import { heldPressure } from '../loss/held-pressure';
import { hoseLoss } from '../loss/hose-loss';
import { noiseDose } from '../noise/noise-dose';
import { zoneOrder } from '../order/zone-order';
import type { Material } from '../pipe/material';
import { runRating } from '../pipe/rating';
import { sizeOf } from '../pipe/size-of';
import { galPerFtOfBore, waterHeld } from '../pipe/water-held';
import { compressedF } from '../temperature/discharge';
import { hoseCooling } from '../temperature/hose-cooling';
import { valueOf } from './fixtures';

/** Inputs of an example in the manual, by name, as written. */
export class ExampleInputs {
  constructor(private readonly given: Readonly<Record<string, string>>) {}

  text(name: string): string {
    const value = this.given[name];
    if (value === undefined) throw new Error(`the example does not give ${name}`);
    return value;
  }

  number(name: string): number {
    const value = Number(this.text(name));
    if (Number.isNaN(value)) throw new Error(`${name} is no number`);
    return value;
  }

  list(name: string): number[] {
    return this.text(name).split(',').map(Number);
  }

  run() {
    const material = this.text('material') as Material;
    const lengthFt = 'lengthFt' in this.given ? this.number('lengthFt') : 100;
    return { id: 'run', material, nominalIn: this.number('nominalIn'), lengthFt };
  }

  hose(couplings: number) {
    return { insideDiameterIn: this.number('hoseIn'), lengthFt: this.number('hoseFt'), couplings };
  }
}

const air = { atmospherePsia: seaLevelPsia, airTemperatureF: 70 };

/** What each example of the manual computes, by formula. */
export const computeExample: Readonly<Record<FormulaId, (given: ExampleInputs) => object>> = {
  'inside-diameter': (given) => valueOf(sizeOf(given.run().material, given.number('nominalIn'))),
  'water-held': (given) => valueOf(waterHeld([given.run()])),
  'pipe-rating': (given) => valueOf(runRating(given.run(), given.number('airTemperatureF'))),
  'pressure-ceiling': (given) =>
    valueOf(
      pressureCeiling({
        runs: [given.run()],
        parts: [{ name: 'part', ratedPsi: given.number('partPsi') }],
        companyCapPsi: given.number('companyCapPsi'),
        airTemperatureF: given.number('airTemperatureF'),
      }),
    ),
  'standard-atmosphere': (given) => valueOf(standardAtmosphere(given.number('altitudeFt'))),
  displacement: (given) =>
    valueOf(
      displacementAir(
        given.number('flowGpm'),
        gaugePsi(given.number('linePsi')),
        absolutePsi(given.number('atmospherePsia')),
      ),
    ),
  'open-heads': (given) =>
    valueOf(
      openHeadsAir(
        given.number('flowGpm'),
        given.number('designPressurePsi'),
        gaugePsi(given.number('headPsi')),
        {
          atmospherePsia: absolutePsi(given.number('atmospherePsia')),
          airTemperatureF: given.number('airTemperatureF'),
        },
      ),
    ),
  'compressor-delivery': (given) => {
    const delivery = valueOf(compressorDelivery(given.number('freeAirCfm'), given.number('altitudeFt')));
    return { ...delivery, deliveredCfm: delivery.freeAirCfm };
  },
  'line-pressure-held': (given) =>
    valueOf(
      heldPressure(
        {
          flowGpm: given.number('flowGpm'),
          designPressurePsi: given.number('designPressurePsi'),
          deliveredCfm: given.number('deliveredCfm'),
          regulatorPsi: gaugePsi(given.number('regulatorPsi')),
          path: [hoseBore(given.hose(2), 1.5)],
        },
        air,
      ),
    ),
  'water-pushed': (given) => {
    const pushed = valueOf(
      waterPushed(
        {
          flowGpm: given.number('flowGpm'),
          designPressurePsi: given.number('designPressurePsi'),
          elevationFt: given.number('elevationFt'),
          deliveredCfm: given.number('deliveredCfm'),
          regulatorPsi: gaugePsi(given.number('regulatorPsi')),
        },
        absolutePsi(given.number('atmospherePsia')),
      ),
    );
    return { ...pushed, pushedGpm: pushed.flowGpm };
  },
  'compressor-fit': (given) => {
    const fit = compressorFit({
      deliveredCfm: given.number('deliveredCfm'),
      neededCfm: given.number('neededCfm'),
      planPsi: given.number('planPsi'),
      liftPsi: given.number('liftPsi'),
      headPsi: given.number('headPsi'),
      heldBy: 'compressor',
      headsPopUp: true,
      largestMainIn: given.number('largestMainIn'),
    });
    return { ...fit, reason: fit.reasons[0]?.code, standing: fit.practice.standing };
  },
  'hose-loss': (given) => {
    const hose = given.hose(given.number('couplings'));
    return valueOf(hoseLoss(hose, given.number('freeAirCfm'), gaugePsi(given.number('inletPsi')), air));
  },
  'discharge-temperature': (given) => ({
    dryF: compressedF(
      given.number('airTemperatureF'),
      gaugePsi(given.number('dischargePsi')),
      seaLevelPsia,
      1.4,
      given.number('stages') === 2 ? 2 : 1,
    ),
  }),
  'hose-cooling': (given) =>
    valueOf(
      hoseCooling({
        enteringF: given.number('enteringF'),
        airTemperatureF: given.number('airTemperatureF'),
        hose: {
          insideDiameterIn: 0.75,
          lengthFt: given.number('hoseFt'),
          couplings: 2,
          outsideDiameterIn: given.number('outsideIn'),
        },
        flowKgS: kgSFromCfm(given.number('flowScfm'), 101_325, 294.26),
        wantedF: given.number('wantedF'),
      }),
    ),
  'stored-energy': (given) =>
    valueOf(
      storedEnergy(
        galPerFtOfBore(given.number('boreIn')) * given.number('lengthFt'),
        gaugePsi(given.number('pressurePsi')),
        seaLevelPsia,
      ),
    ),
  'noise-dose': (given) => {
    const hours = given.list('hours');
    return valueOf(
      noiseDose(given.list('levels').map((levelDba, at) => ({ levelDba, hours: hours[at] ?? 0 }))),
    );
  },
  'air-cycles': (given) =>
    valueOf(
      airCycles({
        volumeGal: given.number('volumeGal'),
        pushedGpm: given.number('pushedGpm'),
        headKind: given.text('headKind') as HeadKind,
      }),
    ),
  'zone-order': (given) => {
    const distancesFt = given.list('distancesFt');
    const zones = given.list('elevationsFt').map((elevationFt, at) => ({
      id: `${at + 1}`,
      number: at + 1,
      elevationFt,
      distanceFt: distancesFt[at] ?? null,
    }));
    return {
      order: valueOf(zoneOrder(zones))
        .places.map(({ zoneId }) => zoneId)
        .join(', '),
    };
  },
};
