import { ensureWebBuild } from '../../../server/bin/web-build.mjs';

/** Vitest's global set-up: browser journeys see the client as it is now. */
export default async function setUp() {
  await ensureWebBuild();
}
