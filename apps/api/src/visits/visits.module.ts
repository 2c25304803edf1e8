import { Module } from '@nestjs/common';
import { FeedModule } from '../sync/feed/feed.module';
import { VisitDocumentsService } from './visit-documents.service';
import { VisitsController } from './visits.controller';
import { VisitsService } from './visits.service';

@Module({
  imports: [FeedModule],
  controllers: [VisitsController],
  providers: [VisitsService, VisitDocumentsService],
  exports: [VisitsService, VisitDocumentsService],
})
export class VisitsModule {}
