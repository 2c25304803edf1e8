import { Injectable } from '@nestjs/common';
import type { CompanyDocument } from '@rimeward/contracts';
import type { EntityManager } from 'typeorm';
import { Compressor } from './entities/compressor.entity';
import { Hose } from './entities/hose.entity';

/** Compressors and hoses of the company. */
@Injectable()
export class EquipmentService {
  async of(manager: EntityManager): Promise<Pick<CompanyDocument, 'compressors' | 'hoses'>> {
    const compressors = await manager.find(Compressor, { order: { name: 'ASC' } });
    const hoses = await manager.find(Hose, { order: { name: 'ASC' } });
    return {
      compressors: compressors.map(({ id, name, freeAirCfm, maxPressurePsi, stages, aftercooler }) => ({
        id,
        name,
        freeAirCfm,
        maxPressurePsi,
        stages,
        aftercooler,
      })),
      hoses: hoses.map(({ id, name, insideDiameterIn, lengthFt, couplings }) => ({
        id,
        name,
        insideDiameterIn,
        lengthFt,
        couplings,
      })),
    };
  }
}
