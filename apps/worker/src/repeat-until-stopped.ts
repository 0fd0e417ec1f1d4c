const longestPauseMs = 10_000;
const firstPauseMs = 1000;

/**
 * Does something again and again with a rest between, until it is stopped. A fault is told and the work goes on after a pause that doubles
 * with every further fault.
 */
export function repeatUntilStopped(work: () => Promise<number>, { restMs, onError }: { restMs: number; onError: (fault: unknown) => void }): { stop: () => Promise<void> } {
  let isStopped = false;
  let wake: () => void = () => undefined;
  const rest = (lengthMs: number): Promise<void> => new Promise((resolve) => {
    const timer = setTimeout(resolve, lengthMs);
    wake = () => {
      clearTimeout(timer);
      resolve();
    };
  });
  const run = async (): Promise<void> => {
    for (let pauseMs = 0; !isStopped;) {
      try {
        const done = await work();
        pauseMs = done === 0 ? restMs : 0;
      } catch (fault) {
        onError(fault);
        pauseMs = Math.min(Math.max(pauseMs * 2, firstPauseMs), longestPauseMs);
      }
      if (pauseMs > 0 && !isStopped) await rest(pauseMs);
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
