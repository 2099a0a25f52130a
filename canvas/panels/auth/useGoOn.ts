import { useRouter, type Href } from 'expo-router';
import { useEffect } from 'react';
import { takeWhereTo } from './whereTo';

/** Once someone is in, takes them where they were going before they were asked to sign in. */
export function useGoOn(): void {
  const router = useRouter();
  useEffect(() => {
    const path = takeWhereTo();
    if (path !== null) router.replace(path as Href);
  }, [router]);
}
