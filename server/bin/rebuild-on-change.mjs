import { existsSync, watch } from 'node:fs';
import { WEB_INPUTS } from './web-inputs.mjs';
import { inProject } from './paths.mjs';
import { say } from './say.mjs';
import { ensureWebBuild } from './web-build.mjs';

const QUIET_MS = 300;

/**
 * For npm run dev: rebuilds the web client after a change; reload the page when it says so.
 * @returns {() => void} ends the watching
 */
export function rebuildOnChange() {
  /** @type {NodeJS.Timeout | undefined} */
  let timer;
  let isBuilding = false;
  let isOutdated = false;

  const build = async () => {
    if (isBuilding) {
      isOutdated = true;
      return;
    }
    isBuilding = true;
    do {
      isOutdated = false;
      await ensureWebBuild().catch((error) => say(error instanceof Error ? error.message : String(error)));
    } while (isOutdated);
    isBuilding = false;
  };
  const later = () => {
    clearTimeout(timer);
    timer = setTimeout(() => void build(), QUIET_MS);
  };
  const watchers = WEB_INPUTS.map((name) => inProject(name))
    .filter((place) => existsSync(place))
    .map((place) => watch(place, { recursive: true }, later));
  return () => {
    clearTimeout(timer);
    for (const watcher of watchers) watcher.close();
  };
}
