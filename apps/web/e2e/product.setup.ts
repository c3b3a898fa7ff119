/**
 * Starts the built product with the demo on throw-away data, once for all stories, and stops it after the last. With
 * STORY_BASE_URL and its fellows set, the stories run against what runs there.
 */
export default async function setup(): Promise<(() => Promise<void>) | undefined> {
  if (process.env.STORY_BASE_URL) return undefined;
  const { startProduct } = await import('../../../tools/test/product.mjs');
  const product = await startProduct();
  process.env.STORY_BASE_URL = product.baseUrl;
  process.env.STORY_MAILBOX_URL = product.mailboxUrl;
  process.env.STORY_SIGN_INS = JSON.stringify(product.signIns);
  return product.stop;
}
