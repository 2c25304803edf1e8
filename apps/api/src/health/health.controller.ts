import { Controller, Get, Header, Logger } from '@nestjs/common';
import { Public } from '../auth/access.decorators';
import { ProblemException } from '../common/problem.exception';
import { DatabaseReadiness } from '../database/readiness';

/** Answers 200 once the database answers and is current; says nothing else about the inside. */
@Controller('health')
export class HealthController {
  private readonly logger = new Logger('Health');

  constructor(private readonly database: DatabaseReadiness) {}

  @Public()
  @Get()
  @Header('Cache-Control', 'no-store')
  async read(): Promise<{ status: 'ok' }> {
    if (await this.isReady()) return { status: 'ok' };
    throw new ProblemException('unavailable');
  }

  private async isReady(): Promise<boolean> {
    try {
      const missing = await this.database.missingMigrations();
      if (missing.length > 0) this.logger.warn(`The database lacks migrations: ${missing.join(', ')}`);
      return missing.length === 0;
    } catch (error) {
      this.logger.warn(`The database does not answer: ${String(error)}`);
      return false;
    }
  }
}
