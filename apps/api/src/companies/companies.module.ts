import { Module } from '@nestjs/common';
import { EquipmentModule } from '../equipment/equipment.module';
import { FeedModule } from '../sync/feed/feed.module';
import { CompaniesController } from './companies.controller';
import { CompanyDocumentsService } from './company-documents.service';

@Module({
  imports: [EquipmentModule, FeedModule],
  controllers: [CompaniesController],
  providers: [CompanyDocumentsService],
  exports: [CompanyDocumentsService],
})
export class CompaniesModule {}
