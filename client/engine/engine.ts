import { EngineClient } from './EngineClient.ts';

const clients = new Map<string, EngineClient>();

/**
 * One worker for each purpose, made when it is first asked, so that a preview does not supersede a comparison. A browser without
 * workers answers null: the page then goes without what the worker would have said.
 */
export function engine(purpose: 'preview' | 'comparison'): EngineClient | null {
  if (typeof Worker === 'undefined') return null;
  const existing = clients.get(purpose);
  if (existing) return existing;
  const worker = new Worker(new URL('./engineWorker.ts', import.meta.url), { type: 'module' });
  const made = new EngineClient(worker);
  clients.set(purpose, made);
  return made;
}
