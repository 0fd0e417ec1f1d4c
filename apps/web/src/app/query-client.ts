import { QueryClient } from '@tanstack/react-query';
import { ApiProblem } from '../api-client/api-problem';

const mayHelpToAskAgain = (error: Error): boolean => !(error instanceof ApiProblem) || error.status >= 500 || error.status === 0;

/** Forms never fill themselves anew because the window came back: focus asks for nothing. */
export const queryClient = new QueryClient({
  defaultOptions: {
    queries: {
      refetchOnWindowFocus: false,
      staleTime: 5_000,
      retry: (failures, error) => failures < 2 && mayHelpToAskAgain(error),
    },
    mutations: { retry: false },
  },
});
