import { View } from 'react-native';
import { Button } from '../../ui/Button';
import { Empty } from '../../ui/States';
import { ThemeProvider } from '../../ui/theme';
import { space } from '../../ui/tokens';
import { useWords } from '../../ui/words';
import { Paper } from './Paper';

/** Shown where a screen threw: nothing saved is lost, and there is a way on. Brings its own theme, as all else may be gone. */
export function ScreenBroke({ error, retry }: { error: Error; retry: () => Promise<void> }) {
  const t = useWords();
  return (
    <ThemeProvider>
      <Paper>
        <View role="alert" style={{ flex: 1 }}>
          <Empty
            icon="warning"
            title={t('common.errors.screen')}
            text={t('common.errors.screenTells')}
            action={
              <View style={{ flexDirection: 'row', gap: space.m }}>
                <Button label={t('common.tryAgain')} onPress={() => void retry()} />
                <Button
                  kind="filled"
                  label={t('common.errors.reload')}
                  spoken={`${t('common.errors.reload')}: ${error.name}`}
                  onPress={() => globalThis.location?.reload()}
                />
              </View>
            }
          />
        </View>
      </Paper>
    </ThemeProvider>
  );
}
