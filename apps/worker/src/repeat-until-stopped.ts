/** Does something again and again with a rest between, until it is stopped; a fault is told and the work goes on. */
export function repeatUntilStopped(work: () => Promise<number>, { restMs, onError }: { restMs: number; onError: (fault: unknown) => void }): { stop: () => Promise<void> } {
  let isStopped = false;
  let wake: () => void = () => undefined;
  const rest = (): Promise<void> => new Promise((resolve) => {
    const timer = setTimeout(resolve, restMs);
    wake = () => {
      clearTimeout(timer);
      resolve();
    };
  });
  const run = async (): Promise<void> => {
    while (!isStopped) {
      const done = await work().catch((fault: unknown) => {
        onError(fault);
        return 0;
      });
      if (done === 0 && !isStopped) await rest();
    }
  };
  const running = run();
  return {
    stop: async () => {
      isStopped = true;
      wake();
      await running;
    },
  };
}
