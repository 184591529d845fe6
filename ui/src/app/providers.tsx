import { Theme } from '@radix-ui/themes';
import { QueryClientProvider, type QueryClient } from '@tanstack/react-query';
import type { ReactNode } from 'react';
import { ToastProvider } from '../components/toast';

/** Look, cache and toasts for everything inside. Light or dark stands on the html element. */
export function Providers({ queryClient, children }: { queryClient: QueryClient; children: ReactNode }) {
  return (
    <Theme accentColor="bronze" grayColor="sand" radius="small" panelBackground="solid" appearance="inherit">
      <QueryClientProvider client={queryClient}>
        <ToastProvider>{children}</ToastProvider>
      </QueryClientProvider>
    </Theme>
  );
}
