import { Slot } from 'expo-router';
import { ClientProvider } from '@/client/client-provider';

export default function RootLayout() {
  return (
    <ClientProvider>
      <Slot />
    </ClientProvider>
  );
}
