import { SetMetadata } from '@nestjs/common';
import type { Role } from '@rimeward/contracts';

export const ACCESS = Symbol('access');

export type Access = { kind: 'public' } | { kind: 'device' } | { kind: 'roles'; roles: Role[] };

/** Anybody may call this route. */
export const Public = () => SetMetadata(ACCESS, { kind: 'public' } satisfies Access);

/** A phone may call this route with the credential of its device; `DeviceGuard` checks it. */
export const ForDevices = () => SetMetadata(ACCESS, { kind: 'device' } satisfies Access);

/** People with one of these roles may call this route. */
export const Roles = (...roles: Role[]) => SetMetadata(ACCESS, { kind: 'roles', roles } satisfies Access);

/** Everybody who has signed in may call this route. */
export const SignedIn = () => Roles('technician', 'supervisor', 'office', 'owner');
