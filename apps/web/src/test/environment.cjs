const { TestEnvironment } = require('jest-environment-jsdom');

/** What browsers have and jsdom leaves out, taken from Node so that fetch and the router behave as they do in a browser. */
const FROM_NODE = {
  TextEncoder,
  TextDecoder,
  structuredClone,
  fetch,
  Request,
  Response,
  Headers,
  ReadableStream,
  WritableStream,
  TransformStream,
  BroadcastChannel,
  AbortController,
  AbortSignal,
};

/** jsdom with Node's fetch and streams. */
module.exports = class BrowserLikeEnvironment extends TestEnvironment {
  async setup() {
    await super.setup();
    Object.assign(this.global, FROM_NODE);
  }
};
