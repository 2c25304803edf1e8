import { Controller, Get, Header } from '@nestjs/common';
import { InjectDataSource } from '@nestjs/typeorm';
import type { DataSource } from 'typeorm';
import { Public } from '../auth/access.decorators';
import { ProblemException } from '../common/problem.exception';

/** Answers 200 once the database answers; says nothing else about the inside. */
@Controller('health')
export class HealthController {
  constructor(@InjectDataSource() private readonly dataSource: DataSource) {}

  @Public()
  @Get()
  @Header('Cache-Control', 'no-store')
  async read(): Promise<{ status: 'ok' }> {
    try {
      await this.dataSource.query('select 1');
    } catch (cause) {
      throw new ProblemException('unavailable', { detail: cause instanceof Error ? cause.name : undefined });
    }
    return { status: 'ok' };
  }
}
