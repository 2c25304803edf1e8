import { Module } from '@nestjs/common';
import { VisitsModule } from '../visits/visits.module';
import { ProjectionService } from './projection.service';
import { VisitProjector } from './visit-projector';

/** At-a-glance copies of visits, kept up to date with the log. */
@Module({
  imports: [VisitsModule],
  providers: [ProjectionService, VisitProjector],
  exports: [ProjectionService],
})
export class ProjectionModule {}
