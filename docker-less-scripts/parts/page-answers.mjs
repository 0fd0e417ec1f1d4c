// Exits 0 when the server at the given address says that it is ready and the page itself is served.
const base = process.argv[2];

const isGood = async (path) => {
  const answer = await fetch(base + path, { signal: AbortSignal.timeout(3000), redirect: 'manual' });
  await answer.arrayBuffer();
  return answer.status === 200;
};

const isUp = await Promise.all([isGood('/readyz'), isGood('/')]).catch(() => [false]);
process.exit(isUp.every(Boolean) ? 0 : 1);
