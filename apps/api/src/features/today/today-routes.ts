import { getToday } from '@leeside/contracts/today';
import { readToday } from '@leeside/database/today-read-model';
import type { Router } from 'express';
import type { ApiTools } from '../../api-tools.js';
import { mountEndpoint } from '../../http/mount-endpoint.js';

export function mountToday(router: Router, tools: ApiTools): void {
  mountEndpoint(router, tools, getToday, async ({ principal }) => ({ status: 200, body: await readToday(tools.db, principal.labId) }));
}
