import { describe, expect, inject, it } from 'vitest';
import '../setup/provided';

describe('GET /api/health', () => {
  it('says ready, without a sign-in, when the database answers', async () => {
    const answer = await fetch(`${inject('baseUrl')}/api/health`);
    expect(answer.status).toBe(200);
    expect(await answer.json()).toEqual({ status: 'ready' });
  });
});
