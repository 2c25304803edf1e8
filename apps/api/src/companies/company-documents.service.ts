import { Injectable } from '@nestjs/common';
import type { CompanyDocument } from '@rimeward/contracts';
import { IsNull, type EntityManager } from 'typeorm';
import { EquipmentService } from '../equipment/equipment.service';
import { User } from '../users/entities/user.entity';
import { Company } from './entities/company.entity';

/** What every phone of a company carries: settings, equipment, the names of the people. */
@Injectable()
export class CompanyDocumentsService {
  constructor(private readonly equipment: EquipmentService) {}

  async document(manager: EntityManager): Promise<CompanyDocument> {
    const company = await manager.findOneOrFail(Company, { where: {} });
    const people = await manager.find(User, { where: { disabledAt: IsNull() }, order: { name: 'ASC' } });
    return {
      id: company.id,
      name: company.name,
      settings: company.settings,
      ...(await this.equipment.of(manager)),
      people: people.map(({ id, name, blowOutSignedOff }) => ({ id, name, blowOutSignedOff })),
    };
  }
}
