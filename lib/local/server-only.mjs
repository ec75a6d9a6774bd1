import { register } from 'node:module';

// Outside the bundler, the marker that keeps server files out of the browser has nothing to guard: it resolves to an empty module.
const hook = `export const resolve = (name, context, next) =>
  name === 'server-only' ? { url: 'data:text/javascript,', shortCircuit: true } : next(name, context);`;

register(`data:text/javascript,${encodeURIComponent(hook)}`);
