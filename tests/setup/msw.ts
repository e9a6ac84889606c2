import { setupServer } from 'msw/node';
import { afterAll, afterEach, beforeAll } from 'vitest';

/** Stands in for the network of a test; each test says with `network.use(…)` what it expects to be asked. */
export const network = setupServer();

beforeAll(() => network.listen({ onUnhandledRequest: 'error' }));
afterEach(() => network.resetHandlers());
afterAll(() => network.close());
