'use client';

import { Timer } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { useEffect, useState } from 'react';
import { Button } from '@/components/ui/button';

const stripSeconds = 15;
const radius = 20;
const around = 2 * Math.PI * radius;

type State = { phase: 'idle' } | { phase: 'running'; left: number } | { phase: 'done' };

/** Fifteen seconds from the water to the reading, as a ring. */
export function StripTimer() {
  const t = useTranslations('readings.timer');
  const [until, setUntil] = useState<number | null>(null);
  const [state, setState] = useState<State>({ phase: 'idle' });

  useEffect(() => {
    if (until === null) return;
    const look = () => {
      const left = Math.ceil((until - performance.now()) / 1000);
      setState(left > 0 ? { phase: 'running', left } : { phase: 'done' });
      if (left <= 0) window.clearInterval(ticking);
    };
    const ticking = window.setInterval(look, 200);
    return () => window.clearInterval(ticking);
  }, [until]);

  const start = () => {
    setUntil(performance.now() + stripSeconds * 1000);
    setState({ phase: 'running', left: stripSeconds });
  };

  if (state.phase === 'idle')
    return (
      <Button wide onClick={start}>
        <Timer aria-hidden="true" className="size-5" />
        {t('start', { seconds: stripSeconds })}
      </Button>
    );
  const left = state.phase === 'running' ? state.left : 0;
  return (
    <div className="grid grid-cols-[46px_1fr_auto] items-center gap-3.5 rounded border-control border-ink bg-paper-lift px-3 py-2">
      <svg width="46" height="46" viewBox="0 0 46 46" aria-hidden="true">
        <circle cx="23" cy="23" r={radius} className="fill-none stroke-rule-2" strokeWidth="3" />
        <circle
          cx="23"
          cy="23"
          r={radius}
          className="fill-none stroke-teal"
          strokeWidth="3.6"
          strokeDasharray={around}
          strokeDashoffset={around * (1 - left / stripSeconds)}
          transform="rotate(-90 23 23)"
        />
        <text x="23" y="29" textAnchor="middle" className="fill-ink font-display text-[18px] font-headline">
          {left}
        </text>
      </svg>
      <p>
        {/* Only the end is read out: a voice that counts would talk over everything. */}
        <b role="status" className="block text-[16px] leading-5 font-strong">
          {state.phase === 'done' ? t('done') : ''}
        </b>
        {state.phase === 'running' ? (
          <b className="block text-[16px] leading-5 font-strong">{t('left', { left })}</b>
        ) : null}
        <span className="text-small text-ink-2">{t('note', { seconds: stripSeconds })}</span>
      </p>
      {state.phase === 'done' ? (
        <Button variant="quiet" onClick={start}>
          {t('again')}
        </Button>
      ) : null}
    </div>
  );
}
