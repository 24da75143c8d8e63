import { QueryClientProvider } from '@tanstack/react-query';
import { PersistQueryClientProvider } from '@tanstack/react-query-persist-client';
import { useState, type ReactNode } from 'react';
import { keepsOffline, makeQueryClient, persister } from './query-client';
import { useOutboxFlusher } from './outbox-hooks';

const day = 24 * 60 * 60 * 1000;
/** Raise it when the shape of kept answers changes: older ones are then dropped, entries never. */
const buster = '1';

function Flusher(): null {
  useOutboxFlusher();
  return null;
}

/** The one client data layer: answers kept for offline, and the outbox being sent. */
export function DataProvider({ children }: { children: ReactNode }) {
  const [client] = useState(makeQueryClient);
  if (typeof indexedDB === 'undefined') {
    // The same tree as below, or ids made while pre-rendering would not fit those in the browser.
    return (
      <QueryClientProvider client={client}>
        <Flusher />
        {children}
      </QueryClientProvider>
    );
  }
  return (
    <PersistQueryClientProvider
      client={client}
      persistOptions={{
        persister,
        maxAge: 30 * day,
        buster,
        dehydrateOptions: {
          shouldDehydrateQuery: (query) =>
            query.state.status === 'success' && keepsOffline(query.queryKey),
        },
      }}
    >
      <Flusher />
      {children}
    </PersistQueryClientProvider>
  );
}
