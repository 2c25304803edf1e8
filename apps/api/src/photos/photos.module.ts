import { Module } from '@nestjs/common';
import { ENVIRONMENT } from '../config/config.module';
import type { Environment } from '../config/environment';
import { PhotoIntakeController } from './photo-intake.controller';
import { PhotoIntakeService } from './photo-intake.service';
import { PhotoViewController } from './photo-view.controller';
import { PhotoViewService } from './photo-view.service';
import { Previews } from './previews.service';
import { DiskPhotoStorage } from './storage/disk-photo-storage';
import { PhotoStorage } from './storage/photo-storage';

/** Photographs: taken in parts, checked, kept, and shown to whom they concern. */
@Module({
  controllers: [PhotoIntakeController, PhotoViewController],
  providers: [
    PhotoIntakeService,
    PhotoViewService,
    Previews,
    {
      provide: PhotoStorage,
      inject: [ENVIRONMENT],
      useFactory: (environment: Environment) => new DiskPhotoStorage(environment.PHOTO_DIR),
    },
  ],
})
export class PhotosModule {}
