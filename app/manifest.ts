import { type MetadataRoute } from 'next';

export default function manifest(): MetadataRoute.Manifest {
  return {
    name: 'Rimewright',
    short_name: 'Rimewright',
    description: 'Winter road care, from pavement temperature to an honest ledger.',
    start_url: '/',
    display: 'standalone',
    // The night ground: the tablet in the cab opens dark.
    background_color: '#141312',
    theme_color: '#141312',
    icons: [
      { src: '/icon.svg', type: 'image/svg+xml', sizes: 'any', purpose: 'any' },
      { src: '/icons/maskable.svg', type: 'image/svg+xml', sizes: 'any', purpose: 'maskable' },
    ],
  };
}
