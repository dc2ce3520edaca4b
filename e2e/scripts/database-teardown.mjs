/** After the tests: the throw-away cluster goes, a given one stays. */
export default async function tearDown() {
  await globalThis.emberlotTestCluster?.stop();
}
