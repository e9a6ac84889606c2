import { handle } from '@/lib/server/handle';
import { readRoadMapText } from '@/lib/server/road-map-view';
import { taggedJson } from '@/lib/server/tagged-json';

export const GET = handle({ action: 'roads.view', reply: 'response' }, async ({ request }) => {
  const { version, text } = await readRoadMapText();
  return taggedJson(request, `roads-${version}`, () => text);
});
