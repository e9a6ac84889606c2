import { StormStateParams } from '@/lib/contracts/storm-state';
import { handle } from '@/lib/server/handle';
import { readStormStateText } from '@/lib/server/storm-state-view';
import { taggedJson } from '@/lib/server/tagged-json';

export const GET = handle(
  { action: 'roads.view', params: StormStateParams, reply: 'response' },
  async ({ params, request }) => {
    const { version, text } = await readStormStateText({ id: params.id, now: new Date() });
    const ready = await text;
    return taggedJson(request, `storm-${version}`, () => ready);
  },
);
