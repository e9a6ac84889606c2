import 'vitest';

declare module 'vitest' {
  interface ProvidedContext {
    /** an address of the server on which tests may make databases */
    adminUrl: string;
    /** the migrated database that copies are made of */
    templateName: string;
    /** the started product, over a copy of the demo */
    baseUrl: string;
    databaseUrl: string;
  }
}
