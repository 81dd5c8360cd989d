'use client';

import { useTranslations } from 'next-intl';
import type { Curve } from '@/lib/client/worked-out/examples/curve';
import type { HowPage } from '@/lib/client/worked-out/how-page';
import { curveCourse } from './curve-course';
import { useWritten } from './use-written';

/** A drawn example in one sentence: what it is, and how each of its lines runs where the sliders stand. */
export function useCurveSentence(): (page: HowPage, curve: Curve) => string {
  const t = useTranslations('how-examples');
  const written = useWritten();
  return (page, { lines, levels = [], across, up }) => {
    const at = (value: number) => written(value, across);
    const level = (value: number) => written(value, { ...up, decimals: up.decimals + 1 });
    const courses = lines.flatMap(({ name, points }) => {
      const course = curveCourse(points);
      if (course === undefined) return [];
      const { start, end, turn } = course;
      const ends = {
        name: t(`figure.${name}`),
        ...{ start: level(start[1]), from: at(start[0]), end: level(end[1]), to: at(end[0]) },
      };
      if (turn) return [t('courseOver', { ...ends, turn: level(turn[1]), turnAt: at(turn[0]) })];
      return [t(ends.start === ends.end ? 'courseLevel' : 'course', ends)];
    });
    const limits = levels.map(({ name, at: value }) =>
      t('courseLevel', { name: t(`figure.${name}`), start: level(value) }),
    );
    const sentence = t(`sentence.${page}`);
    return courses.length === 0
      ? sentence
      : t('drawn', { sentence, courses: [...courses, ...limits].join(t('courseJoiner')) });
  };
}
