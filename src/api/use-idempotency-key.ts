import { useRef } from 'react';
import { newIdempotencyKey } from './http-client';

export interface IdempotencyKey {
  /** The key of this attempt; the same through double clicks and retries of the same content. */
  keyFor: (content: unknown) => string;
  /** After success: the next create is another thing. */
  renew: () => void;
}

/**
 * The server refuses a key that comes with another body, so a form corrected after a failure gets a new one.
 */
export function useIdempotencyKey(): IdempotencyKey {
  const attempt = useRef<{ content: string; key: string } | null>(null);
  return {
    keyFor: (content) => {
      const written = JSON.stringify(content);
      if (attempt.current === null || attempt.current.content !== written) {
        attempt.current = { content: written, key: newIdempotencyKey() };
      }
      return attempt.current.key;
    },
    renew: () => {
      attempt.current = null;
    },
  };
}
