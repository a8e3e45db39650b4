import { checkNode, ensureBuild, ensureModules, serve } from './prepare.mjs';

/** `npm run serve`: the production start. No demo; settings come from the environment, see README.md. */
checkNode();
await ensureModules();
await ensureBuild();
await serve({ NODE_ENV: 'production', DEMO: '' });
