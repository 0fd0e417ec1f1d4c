type Listener = () => void;
const listeners = new Set<Listener>();

/** Told when the server no longer knows this browser and renewing did not help. */
export const signedOut = {
  announce: (): void => listeners.forEach((listener) => listener()),
  subscribe: (listener: Listener): (() => void) => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  },
};
