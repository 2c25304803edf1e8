import { Module } from '@nestjs/common';
import { FeedService } from './feed.service';

/** The feed's writing side, for every module whose changes a phone has to hear of. */
@Module({ providers: [FeedService], exports: [FeedService] })
export class FeedModule {}
