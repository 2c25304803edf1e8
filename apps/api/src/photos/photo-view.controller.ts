import { Controller, Get, Param, Res, StreamableFile } from '@nestjs/common';
import type { Response } from 'express';
import { SignedIn } from '../auth/access.decorators';
import { CurrentPrincipal } from '../auth/current-principal.decorator';
import type { Principal } from '../auth/principal';
import { photoKey } from './photo-key';
import { PhotoViewService } from './photo-view.service';
import type { PictureKind } from './storage/photo-storage';

/** Where photographs are looked at. The bytes are a stranger's: nothing in them can act as a page of ours. */
@Controller('photos')
@SignedIn()
export class PhotoViewController {
  constructor(private readonly view: PhotoViewService) {}

  @Get(':sha256/original')
  original(
    @CurrentPrincipal() reader: Principal,
    @Param('sha256') sha256: string,
    @Res({ passthrough: true }) response: Response,
  ): Promise<StreamableFile> {
    return this.send(reader, sha256, 'original', response);
  }

  @Get(':sha256/preview')
  preview(
    @CurrentPrincipal() reader: Principal,
    @Param('sha256') sha256: string,
    @Res({ passthrough: true }) response: Response,
  ): Promise<StreamableFile> {
    return this.send(reader, sha256, 'preview', response);
  }

  private async send(
    reader: Principal,
    sha256: string,
    kind: PictureKind,
    response: Response,
  ): Promise<StreamableFile> {
    const picture = await this.view.open(reader, photoKey(reader.companyId, sha256), kind);
    response.set({
      'X-Content-Type-Options': 'nosniff',
      'Content-Security-Policy': "sandbox; default-src 'none'",
      'Cross-Origin-Resource-Policy': 'same-origin',
      // An original never changes under its hash; whether this reader may see it can.
      'Cache-Control': kind === 'original' ? 'private, max-age=3600, immutable' : 'private, max-age=300',
    });
    return new StreamableFile(picture.stream, {
      type: picture.type,
      length: picture.bytes,
      disposition: 'inline',
    });
  }
}
