import { useRouter } from 'expo-router';
import { useMemo, useState, type ReactNode } from 'react';
import { ScrollView, View } from 'react-native';
import { errorWords } from '../../client/errorWords';
import { useRevision } from '../../client/revisions';
import { Choice } from '../../ui/Choice';
import { Header } from '../../ui/Header';
import { Empty, Failed, Loading } from '../../ui/States';
import { space } from '../../ui/tokens';
import { useTheme } from '../../ui/theme';
import { useLayout } from '../../ui/useLayout';
import { useWords } from '../../ui/words';
import { PageTitle } from '../shell/PageTitle';
import { useDraft, useWorkspace } from '../workspace/workspace';
import { ChangeWords } from './ChangeWords';
import { ComparePlans, type Side } from './ComparePlans';
import { CompareWalls } from './CompareWalls';
import { compareStates, type State } from './comparedStates';

export interface CompareScreenProps {
  readonly siteId: string;
  /** A revision's number. */
  readonly before: string;
  /** A revision's number, or `draft`. */
  readonly after: string;
}

interface StateProps {
  readonly siteId: string;
  readonly which: string;
  readonly children: (state: State) => ReactNode;
}

/** The draft as it is on the screen now, or a revision once it has been fetched. */
function WithState(props: StateProps) {
  return props.which === 'draft' ? <WithDraft {...props} /> : <WithRevision {...props} />;
}

function WithDraft({ children }: StateProps) {
  const drawing = useDraft((state) => state.drawing);
  const survey = useDraft((state) => state.survey);
  const state = useMemo(() => ({ drawing, survey }), [drawing, survey]);
  return children(state);
}

function WithRevision({ siteId, which, children }: StateProps) {
  const t = useWords();
  const { data, error, isError, refetch } = useRevision(siteId, Number(which));
  if (data) return children(data);
  if (isError)
    return <Failed title={t('revisions.compare.failed')} text={errorWords(t, error)} onRetry={() => void refetch()} />;
  return <Loading />;
}

const isState = (which: string) => which === 'draft' || /^[1-9]\d{0,6}$/.test(which);

/** Two states of a site side by side: what differs, in the drawing and in words, and which poles to mark again. */
export function CompareScreen({ siteId, before, after }: CompareScreenProps) {
  const t = useWords();
  const router = useRouter();
  const { colours } = useTheme();
  const { siteName } = useWorkspace();
  const nameOf = (which: string) =>
    which === 'draft' ? t('revisions.draft') : t('revisions.revision', { number: Number(which) });
  const title =
    after === 'draft' ? t('revisions.compare.titleDraft', { before }) : t('revisions.compare.title', { before, after });
  const back = () => router.replace({ pathname: '/sites/[siteId]/revisions', params: { siteId } });
  return (
    <View style={{ flex: 1, backgroundColor: colours.ground }}>
      <PageTitle title={`${title} · ${siteName}`} />
      <Header title={title} subtitle={siteName} onBack={back} backLabel={t('revisions.title')} />
      {isState(before) && isState(after) ? (
        <WithState siteId={siteId} which={before}>
          {(was) => (
            <WithState siteId={siteId} which={after}>
              {(is) => <Comparing before={was} after={is} names={{ before: nameOf(before), after: nameOf(after) }} />}
            </WithState>
          )}
        </WithState>
      ) : (
        <Empty icon="revisions" title={t('common.notFound.title')} />
      )}
    </View>
  );
}

interface ComparingProps {
  readonly before: State;
  readonly after: State;
  readonly names: { readonly before: string; readonly after: string };
}

function Comparing({ before, after, names }: ComparingProps) {
  const t = useWords();
  const { colours, strokes } = useTheme();
  const phone = useLayout().name === 'phone';
  const [shown, setShown] = useState<'plan' | 'walls'>('plan');
  const [side, setSide] = useState<Side>(phone ? 'after' : 'both');
  const compared = useMemo(() => compareStates(before, after), [before, after]);
  const sides: readonly { value: Side; label: string }[] = phone
    ? [
        { value: 'before', label: names.before },
        { value: 'after', label: names.after },
        { value: 'overlay', label: t('revisions.compare.overlay') },
      ]
    : [
        { value: 'both', label: t('revisions.compare.sideBySide') },
        { value: 'overlay', label: t('revisions.compare.overlay') },
      ];
  const figures = (
    <View style={{ flex: phone ? 5 : 1, minHeight: 0, minWidth: 0 }}>
      <View
        style={{
          flexDirection: phone ? 'column' : 'row',
          gap: space.s,
          padding: space.s,
          backgroundColor: colours.surface,
          borderBottomWidth: strokes.hair,
          borderColor: colours.rule,
        }}
      >
        <View style={{ minWidth: 220 }}>
          <Choice
            label={t('revisions.compare.changes')}
            hideLabel
            options={[
              { value: 'plan', label: t('common.nav.plan') },
              { value: 'walls', label: t('common.nav.walls') },
            ]}
            value={shown}
            onChange={setShown}
          />
        </View>
        {shown === 'plan' ? (
          <View style={{ minWidth: 300 }}>
            <Choice label={t('revisions.compare.pick')} hideLabel options={sides} value={side} onChange={setSide} />
          </View>
        ) : null}
      </View>
      {shown === 'plan' ? (
        <ComparePlans compared={compared} names={names} side={side} />
      ) : (
        <CompareWalls compared={compared} names={names} />
      )}
    </View>
  );
  return (
    <View style={{ flex: 1, minHeight: 0, flexDirection: phone ? 'column' : 'row' }}>
      {figures}
      <ScrollView
        // Words only: without this the keyboard could not scroll it.
        tabIndex={0}
        style={{
          flex: phone ? 4 : undefined,
          width: phone ? undefined : 380,
          flexGrow: phone ? 4 : 0,
          backgroundColor: colours.surface,
          borderLeftWidth: phone ? 0 : strokes.hair,
          borderTopWidth: phone ? strokes.hair : 0,
          borderColor: colours.rule,
        }}
      >
        <ChangeWords compared={compared} />
      </ScrollView>
    </View>
  );
}
