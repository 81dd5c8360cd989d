import { Flame, type LucideIcon, Phone, PhoneCall } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { buttonClass } from '@/components/ui/button-class';
import { dialled } from '@/components/ui/phone-link';
import { textLink } from '@/components/ui/text-link';
import { type EmergencyCountry, emergencyNumbers } from '@/lib/standards/emergency-numbers';

/** Whom to call, one tap each. Where a number is not certain, words stand in its place. */
export function EmergencyCalls({ country, chooseHref }: { country: EmergencyCountry; chooseHref: string }) {
  const t = useTranslations('help.emergency');
  const { emergency, poison } = emergencyNumbers(country);
  return (
    <div>
      {emergency === null ? (
        <p className="border-due border-ink bg-paper-lift px-4 py-3 text-field font-strong">{t('localEmergency')}</p>
      ) : (
        <div className="grid gap-2.5 sm:grid-cols-2 print:grid-cols-1">
          <CallButton Icon={PhoneCall} name={t('callEmergency')} number={emergency} variant="terra" wide />
          {poison === null ? null : <CallButton Icon={Phone} name={t('poisonCentre')} number={poison} />}
          <CallButton Icon={Flame} name={t('fireService')} number={emergency} wide={poison === null} />
        </div>
      )}
      {poison === null ? <p className="mt-2.5 text-body">{t('poisonOnLabel')}</p> : null}
      <p className="mt-2.5 text-small text-ink-2">
        {t.rich('numbersFor', {
          country: t(`country.${country}`),
          link: (words) => (
            <a href={chooseHref} className={`${textLink} inline-flex min-h-11 items-center text-ink print:hidden`}>
              {words}
            </a>
          ),
        })}
      </p>
    </div>
  );
}

type CallButtonProps = {
  Icon: LucideIcon;
  name: string;
  number: string;
  variant?: 'terra' | 'outline';
  wide?: boolean;
};

/** The number stands in words too: a card on paper cannot be tapped, and a borrowed phone is dialled by hand. */
function CallButton({ Icon, name, number, variant = 'outline', wide = false }: CallButtonProps) {
  const t = useTranslations('help.emergency');
  const look = buttonClass({
    variant,
    size: 'large',
    className: `justify-start min-h-14.5 print:min-h-0 print:py-1 ${wide ? 'sm:col-span-2 print:col-span-1' : ''}`,
  });
  return (
    <a href={dialled(number)} aria-label={t('dial', { name, number })} className={look}>
      <Icon aria-hidden="true" className="size-5.5 shrink-0" />
      <span className="min-w-0 text-left">
        <span className="block">{name}</span>
        <span className="block text-label font-text">{number}</span>
      </span>
    </a>
  );
}
