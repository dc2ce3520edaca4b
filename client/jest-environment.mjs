import { TestEnvironment } from 'jest-environment-jsdom';

/** jsdom leaves out what the API layer needs; Node has it. */
const fromNode = [
  'TextEncoder',
  'TextDecoder',
  'fetch',
  'Request',
  'Response',
  'Headers',
  // Node's Request takes no other kind of signal.
  'AbortController',
  'AbortSignal',
  'ReadableStream',
  'WritableStream',
  'TransformStream',
  'structuredClone',
  // Node's Request can't read the files of jsdom.
  'File',
  'FormData',
];

export default class BrowserEnvironment extends TestEnvironment {
  async setup() {
    await super.setup();
    for (const name of fromNode) this.global[name] = globalThis[name];
  }
}
