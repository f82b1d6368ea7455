const { TestEnvironment } = require('jest-environment-jsdom');

/** jsdom with what browsers have had for years and jsdom leaves out. */
module.exports = class BrowserEnvironment extends TestEnvironment {
  async setup() {
    await super.setup();
    const browser = this.global;
    Object.assign(browser, {
      TextEncoder: globalThis.TextEncoder,
      TextDecoder: globalThis.TextDecoder,
      structuredClone: globalThis.structuredClone,
      fetch: globalThis.fetch,
      Request: globalThis.Request,
      Response: globalThis.Response,
      Headers: globalThis.Headers,
      ReadableStream: globalThis.ReadableStream,
      WritableStream: globalThis.WritableStream,
      TransformStream: globalThis.TransformStream,
    });
    browser.matchMedia = (query) => ({
      matches: false,
      media: query,
      onchange: null,
      addEventListener: () => undefined,
      removeEventListener: () => undefined,
      addListener: () => undefined,
      removeListener: () => undefined,
      dispatchEvent: () => false,
    });
    browser.ResizeObserver = class {
      observe() {}
      unobserve() {}
      disconnect() {}
    };
    browser.PointerEvent ??= class PointerEvent extends browser.MouseEvent {};
    // jsdom lays nothing out; a table that draws what is in sight needs something to be in sight.
    Object.defineProperties(browser.HTMLElement.prototype, {
      offsetHeight: { configurable: true, value: 600 },
      offsetWidth: { configurable: true, value: 800 },
    });
    browser.Element.prototype.scrollTo = () => undefined;
    browser.Element.prototype.scrollIntoView = () => undefined;
    browser.scrollTo = () => undefined;
  }
};
