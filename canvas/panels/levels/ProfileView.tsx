import { useMemo, useState } from 'react';
import { View } from 'react-native';
import { profileFigure } from '../../../model/figures/profile';
import type { Figure } from '../../../model/figures/figure';
import { FigureView } from '../../figures/FigureView';
import { labelScale } from '../../figures/labelScale';
import { useWords } from '../../ui/words';
import { fitBox, type Camera, type ViewSize } from '../../viewport/camera';
import { useSolved } from '../workspace/workspace';

const PADDING = { left: 14, top: 8, right: 14, bottom: 8 };
/** Part of the figure's height that the foundation's range takes up. */
const RANGE_PART = 0.36;

interface Seen {
  readonly figure: Figure;
  readonly camera: Camera;
}

/** The foundation rolled out along the walls, as wide as there is room; the station being read is lit. */
export function ProfileView({ readingId, height }: { readingId: string | null; height: number }) {
  const t = useWords();
  const { drawing, setOut } = useSolved();
  const [width, setWidth] = useState(0);

  const seen = useMemo<Seen | null>(() => {
    const length = setOut.walls.runs.reduce((sum, run) => sum + run.length, 0);
    if (width < 40 || length <= 0) return null;
    const size: ViewSize = { width, height };
    const draw = (scale: number) =>
      profileFigure(drawing, setOut, { scale: labelScale(scale), readingId, tall: (height * RANGE_PART) / scale });
    // Texts keep their size on the screen, so how much of the width they take is known only once it is drawn.
    const first = fitBox(draw(width / length).bounds, size, PADDING).scale;
    const figure = draw(first);
    return { figure, camera: fitBox(figure.bounds, size, PADDING) };
  }, [drawing, setOut, readingId, width, height]);

  return (
    <View style={{ height }} onLayout={(event) => setWidth(Math.round(event.nativeEvent.layout.width))}>
      {seen ? (
        <FigureView figure={seen.figure} camera={seen.camera} size={{ width, height }} label={t('levels.profile')} />
      ) : null}
    </View>
  );
}
