import { useEffect } from 'react';
import { useIsFocused } from 'expo-router';
import { useWords } from '../../ui/words';

/** Names the browser's tab after the screen while it is the one shown. */
export function PageTitle({ title }: { title: string }) {
  const t = useWords();
  const focused = useIsFocused();
  const product = t('common.product');
  useEffect(() => {
    if (focused) document.title = title === product ? title : `${title} · ${product}`;
  }, [title, product, focused]);
  return null;
}
