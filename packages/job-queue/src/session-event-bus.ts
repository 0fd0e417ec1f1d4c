import { sessionEventSchema, type SessionEvent } from '@leeside/contracts/session-events';
import type { RedisConnection } from './redis-connection.js';

const channelOf = (sessionId: string): string => `session-events:${sessionId}`;

/** Tells whoever watches a session what happened in it. A lost event is harmless: whoever watches asks again. */
export function makeEventPublisher(redis: Pick<RedisConnection, 'publish'>): (sessionId: string, event: SessionEvent) => Promise<void> {
  return async (sessionId, event) => {
    await redis.publish(channelOf(sessionId), JSON.stringify(event)).catch(() => undefined);
  };
}

export interface EventSubscriber {
  /** Calls back for every event of a session until the returned function is called. */
  watch(sessionId: string, onEvent: (event: SessionEvent) => void): Promise<() => void>;
}

/** One connection that fans events out to any number of watchers. */
export function makeEventSubscriber(redis: Pick<RedisConnection, 'subscribe' | 'unsubscribe' | 'on'>): EventSubscriber {
  const watchers = new Map<string, Set<(event: SessionEvent) => void>>();
  redis.on('message', (channel: string, text: string) => {
    const event = sessionEventSchema.safeParse(JSON.parse(text));
    if (event.success) for (const watcher of watchers.get(channel) ?? []) watcher(event.data);
  });
  return {
    watch: async (sessionId, onEvent) => {
      const channel = channelOf(sessionId);
      const group = watchers.get(channel) ?? new Set();
      group.add(onEvent);
      watchers.set(channel, group);
      if (group.size === 1) await redis.subscribe(channel);
      return () => {
        group.delete(onEvent);
        if (group.size > 0) return;
        watchers.delete(channel);
        void redis.unsubscribe(channel);
      };
    },
  };
}
