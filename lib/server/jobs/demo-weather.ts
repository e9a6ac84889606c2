import { appendDemoWeather } from '@/db/commands/append-demo-weather';
import { log } from '../log';

/** Every ten minutes in the demo: its stations report and its weather office forecasts. Elsewhere it does nothing. */
export async function demoWeather(now: Date): Promise<void> {
  const added = await appendDemoWeather({ now });
  if (added.readings + added.forecasts > 0) log('info', 'demo weather', { ...added });
}
