import type { Role } from '@leeside/contracts/roles';

/** The demo lab's people; all are invented and share one password. */
export const demoAccounts: readonly { readonly email: string; readonly name: string; readonly roles: readonly Role[]; readonly clientKey?: string }[] = [
  { email: 'engineer@leeside.example', name: 'Edda Wren', roles: ['engineer'] },
  { email: 'analyst@leeside.example', name: 'Anselm Tarn', roles: ['analyst'] },
  { email: 'qa@leeside.example', name: 'Quilla Brandt', roles: ['qa'] },
  { email: 'admin@leeside.example', name: 'Ada Lowe', roles: ['admin'] },
  { email: 'client-a@leeside.example', name: 'Clem Hollin', roles: ['client'], clientKey: 'client-a' },
  { email: 'client-b@leeside.example', name: 'Cora Quarry', roles: ['client'], clientKey: 'client-b' },
];
