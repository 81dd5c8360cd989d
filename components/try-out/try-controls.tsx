'use client';

import { useTranslations } from 'next-intl';
import { PlainSelect } from '@/components/ui/plain-select';
import { Segments } from '@/components/ui/segments';
import { Stepper } from '@/components/ui/stepper';
import { capitalised } from '@/components/week-sheet/capitalised';
import { instantOf } from '@/components/week-sheet/sheet-times';
import { useDoseWords } from '@/components/week-sheet/use-dose-words';
import { useTimes } from '@/components/week-sheet/use-times';
import { useUnits } from '@/components/week-sheet/use-units';
import type { TryOutStart } from '@/lib/schemas/try-out';
import { type Draft, MOST_SWIMMER_HOURS, swimmersOf, tabletsOf, without } from './draft';
import { likeliestDay, type TryGround } from './try-ground';

type Props = {
  ground: TryGround;
  /** Undefined until somebody has wanted it. */
  start: TryOutStart | undefined;
  draft: Draft;
  onChange: (draft: Draft) => void;
};

/** Label and what the sheet says at the left, the control at the right. */
const row =
  'grid grid-cols-[minmax(0,1fr)_132px] items-center gap-x-3 [&>div:first-child]:mb-0 [&>div:first-child]:block [&>div>span]:block [&>p]:col-span-2';

/** What can be tried: swimmers and sky of one day, slow tablets, a dose on another evening. */
export function TryControls(props: Props) {
  const t = useTranslations('try-out');
  const times = useTimes();
  const { ground, draft, onChange } = props;
  const day = ground.days.find((each) => each.day === draft.day) ?? likeliestDay(ground.days);
  if (day === undefined) return null;
  const dayIn = times.dayInWords(day.from);
  const sky = draft.sky[day.day] ?? 'forecast';
  return (
    <>
      <PlainSelect
        className={row}
        label={t('day')}
        options={ground.days.map((each) => ({ value: each.day, label: capitalised(times.heading(each.from)) }))}
        value={day.day}
        onChange={(chosen) => onChange({ ...draft, day: chosen })}
      />
      <Swimmers {...props} day={day} label={t('swimmers', { day: dayIn })} />
      <Tablets {...props} />
      <Segments
        size="small"
        label={t('sky', { day: dayIn })}
        choices={(['clear', 'forecast', 'overcast'] as const).map((value) => ({ value, label: t(`skies.${value}`) }))}
        value={sky}
        onChange={(chosen) => {
          const others = without(draft.sky, day.day);
          onChange({ ...draft, sky: chosen === 'forecast' ? others : { ...others, [day.day]: chosen } });
        }}
      />
      <Moves {...props} />
    </>
  );
}

function Swimmers({ draft, onChange, day, label }: Props & { day: TryGround['days'][number]; label: string }) {
  const t = useTranslations('try-out');
  const { number } = useUnits();
  const text = draft.swimmers[day.day] ?? number(day.swimmerHours);
  const count = swimmersOf(text);
  const write = (typed: string) => onChange({ ...draft, swimmers: { ...draft.swimmers, [day.day]: typed } });
  return (
    <Stepper
      className={row}
      size="margin"
      label={label}
      aside={t('sheetSays', { count: number(day.swimmerHours) })}
      value={text}
      onChange={write}
      onStep={(direction) => {
        const next = Math.round(count ?? day.swimmerHours) + direction;
        write(number(Math.min(MOST_SWIMMER_HOURS, Math.max(0, next))));
      }}
      moreLabel={t('more')}
      lessLabel={t('less')}
      problem={count === undefined ? t('swimmersProblem', { most: number(MOST_SWIMMER_HOURS) }) : undefined}
    />
  );
}

function Tablets({ ground, start, draft, onChange }: Props) {
  const t = useTranslations('try-out');
  const { number } = useUnits();
  const most = start?.mostTablets;
  if (ground.tablets === undefined && (most === undefined || most === 0)) return null;
  const planned = ground.tablets ?? 0;
  if (most === 0 && planned === 0) return <p className="text-small text-ink-2">{t('noTablets')}</p>;
  const text = draft.tablets ?? number(planned);
  // Before the rules are known only what the plan itself loads is known to keep to them.
  const highest = Math.max(planned, most ?? planned);
  const count = tabletsOf(text, highest);
  const write = (typed: string) => onChange({ ...draft, tablets: typed });
  return (
    <Stepper
      className={row}
      size="margin"
      label={t('tablets')}
      aside={t('planSays', { count: number(planned) })}
      value={text}
      onChange={write}
      onStep={(direction) => write(number(Math.min(highest, Math.max(0, (count ?? planned) + direction))))}
      moreLabel={t('more')}
      lessLabel={t('less')}
      problem={count === undefined ? t('tabletsProblem', { most: number(highest) }) : undefined}
    />
  );
}

const NONE = 'none';

function Moves({ ground, start, draft, onChange }: Props) {
  const t = useTranslations('try-out');
  const times = useTimes();
  const words = useDoseWords();
  const { doses } = ground;
  if (doses.length === 0) return null;
  const moving = doses.find(({ id }) => id === draft.moving);
  const dayOfDose = (dose: (typeof doses)[number]) => draft.moves[dose.id] ?? times.dayOf(instantOf(dose.at));
  // One product a visit: an evening that has a dose already is none to move to.
  const taken = new Set(doses.filter((dose) => dose !== moving).map(dayOfDose));
  const evenings = (start?.evenings ?? []).filter(({ day }) => !taken.has(day));
  const home = moving && times.dayOf(instantOf(moving.at));
  const to = moving && dayOfDose(moving);
  return (
    <>
      <PlainSelect
        label={t('move')}
        options={[
          { value: NONE, label: t('moveNone') },
          ...doses.map((dose) => ({
            value: dose.id,
            label: t('doseOn', {
              dose: words.amountAndProduct(dose),
              day: times.heading(instantOf(dose.at)),
            }),
          })),
        ]}
        value={moving?.id ?? NONE}
        onChange={(chosen) => onChange({ ...draft, moving: chosen === NONE ? undefined : chosen })}
      />
      {moving && home !== undefined && to !== undefined && (
        <PlainSelect
          className={row}
          label={t('moveTo')}
          options={[
            { value: home, label: t('moveStays', { day: times.heading(instantOf(moving.at)) }) },
            ...evenings
              .filter(({ day }) => day !== home)
              .map(({ day, at }) => ({ value: day, label: times.heading(instantOf(at)) })),
          ]}
          value={to}
          onChange={(chosen) => {
            const others = without(draft.moves, moving.id);
            onChange({ ...draft, moves: chosen === home ? others : { ...others, [moving.id]: chosen } });
          }}
        />
      )}
    </>
  );
}
