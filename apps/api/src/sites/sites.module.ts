import { Module } from '@nestjs/common';
import { SitesController } from './sites.controller';
import { SitesService } from './sites.service';

@Module({ controllers: [SitesController], providers: [SitesService] })
export class SitesModule {}
