import { sweepSignInAttempts } from '@/db/commands/sweep-sign-in-attempts';
import { demoWeather } from './demo-weather';

export interface Job {
  queue: string;
  /** cron, UTC */
  schedule: string;
  /** safe to run twice */
  run: (now: Date) => Promise<void>;
}

export const jobs: readonly Job[] = [
  { queue: 'sweep-sign-in-attempts', schedule: '17 3 * * *', run: (now) => sweepSignInAttempts({ now }) },
  { queue: 'demo-weather', schedule: '*/10 * * * *', run: demoWeather },
];
