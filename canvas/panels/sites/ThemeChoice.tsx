import { Choice } from '../../ui/Choice';
import { useTheme } from '../../ui/theme';
import { useWords } from '../../ui/words';

/** Paper colours, or the heavier ones that can be read in the sun. */
export function ThemeChoice() {
  const t = useWords();
  const { name, setTheme } = useTheme();
  return (
    <Choice
      label={t('common.theme.label')}
      value={name}
      onChange={setTheme}
      options={[
        { value: 'light', label: t('common.theme.light'), icon: 'sheets' },
        { value: 'sun', label: t('common.theme.sun'), icon: 'sun' },
      ]}
    />
  );
}
