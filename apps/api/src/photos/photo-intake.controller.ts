import {
  Body,
  Controller,
  HttpCode,
  Param,
  ParseIntPipe,
  Post,
  UploadedFile,
  UseGuards,
  UseInterceptors,
} from '@nestjs/common';
import { FileInterceptor } from '@nestjs/platform-express';
import { photoFields, photoLimits, type AnnounceResponse, type PhotoState } from '@rimeward/contracts';
import { memoryStorage } from 'multer';
import { ForDevices } from '../auth/access.decorators';
import { CurrentDevice, DeviceGuard, type DevicePrincipal } from '../auth/device.guard';
import { ProblemException } from '../common/problem.exception';
import { readAnnouncement } from './announcement';
import { PhotoIntakeService } from './photo-intake.service';
import { photoKey } from './photo-key';

const oneFile = (field: string, fileSize: number): ReturnType<typeof FileInterceptor> =>
  FileInterceptor(field, { storage: memoryStorage(), limits: { fileSize, files: 1, fields: 0, parts: 1 } });

/** Where phones bring photographs, with the credential of the device. Every request may be repeated at will. */
@Controller('photos')
@ForDevices()
@UseGuards(DeviceGuard)
export class PhotoIntakeController {
  constructor(private readonly intake: PhotoIntakeService) {}

  @Post('announce')
  @HttpCode(200)
  async announce(@CurrentDevice() device: DevicePrincipal, @Body() body: unknown): Promise<AnnounceResponse> {
    return { photos: await this.intake.announce(device.companyId, readAnnouncement(body)) };
  }

  @Post(':sha256/parts/:n')
  @HttpCode(200)
  @UseInterceptors(oneFile(photoFields.part, photoLimits.partBytes))
  part(
    @CurrentDevice() device: DevicePrincipal,
    @Param('sha256') sha256: string,
    @Param('n', ParseIntPipe) part: number,
    @UploadedFile() file: Express.Multer.File | undefined,
  ): Promise<PhotoState> {
    return this.intake.takePart(photoKey(device.companyId, sha256), part, bytesOf(file));
  }

  @Post(':sha256/preview')
  @HttpCode(200)
  @UseInterceptors(oneFile(photoFields.preview, photoLimits.previewBytes))
  preview(
    @CurrentDevice() device: DevicePrincipal,
    @Param('sha256') sha256: string,
    @UploadedFile() file: Express.Multer.File | undefined,
  ): Promise<PhotoState> {
    return this.intake.takePreview(photoKey(device.companyId, sha256), bytesOf(file));
  }

  @Post(':sha256/complete')
  @HttpCode(200)
  complete(@CurrentDevice() device: DevicePrincipal, @Param('sha256') sha256: string): Promise<PhotoState> {
    return this.intake.complete(photoKey(device.companyId, sha256));
  }
}

function bytesOf(file: Express.Multer.File | undefined): Buffer {
  if (file === undefined || file.buffer.length === 0) throw new ProblemException('photo-empty');
  return file.buffer;
}
