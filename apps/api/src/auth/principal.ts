import type { Role } from '@rimeward/contracts';

/** Who asks: read from the server's own record of the session with every request. */
export interface Principal {
  companyId: string;
  userId: string;
  name: string;
  role: Role;
  sessionId: string;
  accessExpiresAt: Date;
}
