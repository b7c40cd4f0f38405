export default async function stopCluster() {
  await globalThis.testCluster?.stop();
}
