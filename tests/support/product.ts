import { test as base, expect } from "@playwright/test";
import { guardConsole } from "./browser-console";
import { Product } from "./product-process";

type Shelf = { current?: { file: string; product: Product } };

/**
 * Playwright's `test` with the product under it. Each test file has a server process and a demo database of its own;
 * a server that a test has stopped runs again when the next test begins. A browser console error or a violation of
 * the Content-Security-Policy fails the test unless `allowedErrors` matches it:
 * `test.use({ allowedErrors: [/status of 401/] })`, or `product.allowError(/…/)` within a test.
 */
export const test = base.extend<{ product: Product; allowedErrors: RegExp[] }, { shelf: Shelf }>({
  allowedErrors: [[], { option: true }],

  shelf: [
    async ({}, provide) => {
      const shelf: Shelf = {};
      await provide(shelf);
      await shelf.current?.product.remove();
    },
    { scope: "worker" },
  ],

  product: [
    async ({ shelf, allowedErrors }, provide, { file }) => {
      if (shelf.current?.file !== file) {
        await shelf.current?.product.remove();
        shelf.current = undefined;
        shelf.current = { file, product: await Product.create(file) };
      }
      const { product } = shelf.current;
      product.beginTest(allowedErrors);
      await product.start();
      await provide(product);
    },
    { timeout: 120_000 },
  ],

  baseURL: async ({ product }, provide) => {
    await provide(product.origin);
  },

  context: async ({ context, product }, provide) => {
    const unexpected = guardConsole(context, (text) => product.allows(text));
    await provide(context);
    expect(unexpected, "errors in the browser's console").toEqual([]);
  },
});

export { expect };
