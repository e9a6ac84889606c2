import { type TestProject } from 'vitest/node';
import { dropLeftovers, openDatabaseServer } from './database-server';
import { ensureTemplate } from './template';
import './provided';

/** Global set-up of the database tier: one migrated template, which each test file copies. */
export default async function setup(project: TestProject) {
  const server = await openDatabaseServer();
  await dropLeftovers(server.adminUrl);
  project.provide('adminUrl', server.adminUrl);
  project.provide('templateName', await ensureTemplate(server.adminUrl, 'empty'));
  return async () => {
    await dropLeftovers(server.adminUrl);
    await server.release();
  };
}
