import { QueryClient } from '@tanstack/react-query';
import { ApiFault } from '../lib/api/fault';

/** Asked again only when the connection failed: an answer in words stays an answer. */
export const queryClient = new QueryClient({
  defaultOptions: {
    queries: {
      retry: (times, fault) => fault instanceof ApiFault && fault.noConnection && times < 2,
      refetchOnWindowFocus: false,
      staleTime: 5_000,
    },
    mutations: { retry: false },
  },
});
