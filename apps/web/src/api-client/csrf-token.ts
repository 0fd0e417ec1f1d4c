let token: string | null = null;

/** Kept in memory alone: it comes with every sign-in and with GET /auth/me. */
export const csrfToken = {
  get: (): string | null => token,
  set: (value: string | null): void => {
    token = value;
  },
};
