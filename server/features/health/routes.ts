import type { HandlersOf } from '#server/http/handler.ts';
import type { health } from '#shared/contracts/health.ts';

export const healthHandlers: HandlersOf<typeof health> = {
  async showHealth({ deps }) {
    await deps.pool.query('select 1');
    return { ok: true };
  },
};
