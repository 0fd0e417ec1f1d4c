import type { TokenScope } from '@leeside/database/api-token-store';
import type { Role } from '@leeside/contracts/roles';

/** Who calls, and by what right. */
export interface Principal {
  readonly personId: string;
  readonly labId: string;
  readonly labName: string;
  /** Set for people of a client: they see that client's things alone. */
  readonly clientId: string | null;
  readonly name: string;
  readonly email: string;
  readonly roles: readonly Role[];
  readonly by: { readonly kind: 'cookie'; readonly sessionId: string } | { readonly kind: 'token'; readonly scopes: readonly TokenScope[] };
}
