import { SetMetadata } from '@nestjs/common';
import type { Permission } from '@brimgate/rules';

export type Access = 'open' | 'signed-in' | readonly Permission[];
export const ACCESS = 'brimgate:access';

/** Lets a person in whose role has any of these permissions. A route without @Allow, @SignedIn or @Open is refused. */
export const Allow = (...permissions: readonly [Permission, ...Permission[]]) => SetMetadata(ACCESS, permissions);

/** Lets every signed-in person in. */
export const SignedIn = () => SetMetadata(ACCESS, 'signed-in' satisfies Access);

/** Lets everybody in, signed in or not. */
export const Open = () => SetMetadata(ACCESS, 'open' satisfies Access);
