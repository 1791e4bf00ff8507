import { generateSW } from 'workbox-build';

/** The entry of the app is over a megabyte; everything larger than this is read from the network. */
const LARGEST_KEPT_BYTES = 5_000_000;

/**
 * Writes `sw.js` over a built web app, so that it opens without signal. The
 * worker answers pages and files of the app only: what the server knows is
 * never answered from a cache of its own.
 */
export async function buildServiceWorker(directory: string): Promise<void> {
  const { count, warnings } = await generateSW({
    globDirectory: directory,
    globPatterns: ['**/*.{html,js,mjs,css,woff2,svg,png,ico,webmanifest,json}'],
    globIgnores: ['**/metadata.json', '**/*.map', 'sw.js'],
    swDest: `${directory}/sw.js`,
    inlineWorkboxRuntime: true,
    navigateFallback: '/index.html',
    navigateFallbackDenylist: [/^\/api\//],
    // Expo names built files by their content.
    dontCacheBustURLsMatching: /[0-9a-f]{32}/,
    maximumFileSizeToCacheInBytes: LARGEST_KEPT_BYTES,
    // A new worker waits until every tab is closed: code is never swapped under an open form.
    skipWaiting: false,
    clientsClaim: true,
    sourcemap: false,
  });
  for (const warning of warnings) console.warn(warning);
  if (count === 0) throw new Error(`Nothing to keep in ${directory}`);
}
