'use client';

import { useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Callout } from '@/components/ui/callout';
import { Skeleton } from '@/components/ui/skeleton';
import { bold } from '@/components/week-sheet/bold';
import { useUnits } from '@/components/week-sheet/use-units';
import { type Purchase, purchasesIn, type PurchaseSubstance } from '@/lib/client/purchases';
import type { PlannedWeek } from '@/lib/client/readings';
import { shelfOptions } from '@/lib/client/shelf-products';

/** What Wadewell never plans, whatever a slip says. */
const keptAway = ['copper', 'clearing', 'blend'] as const;
type KeptAway = (typeof keptAway)[number];
type Product = PurchaseSubstance | KeptAway;

/** After a shop slip: what of the shop's advice this week needs, and what it does not. */
export function ShopPurchases({ week }: { week: PlannedWeek }) {
  const t = useTranslations('house.shop');
  const shelf = useQuery(shelfOptions());
  const purchases = shelf.data && purchasesIn(week, shelf.data);
  return (
    <section aria-labelledby="shop-said" className="border-t border-rule pt-3">
      <h2 id="shop-said" className="font-display text-section">
        {t('title')}
      </h2>
      {purchases === undefined ? (
        shelf.isPending ? (
          <Skeleton label={t('loading')} className="mt-2 h-24" />
        ) : (
          <p role="alert" className="text-body">
            {t('notLoaded')}
          </p>
        )
      ) : purchases === null ? (
        <p className="text-body">{t('noPlan')}</p>
      ) : (
        <Said purchases={purchases} />
      )}
    </section>
  );
}

function Said({ purchases }: { purchases: readonly Purchase[] }) {
  const t = useTranslations('house.shop');
  const [said, setSaid] = useState<readonly Product[]>([]);
  const { taken } = useAmounts();
  const products: readonly Product[] = [...purchases.map(({ substance }) => substance), ...keptAway];
  const toBuy = purchases.filter(({ answer }) => answer === 'needed');
  const ofTheSlip = toBuy.filter(({ substance }) => said.includes(substance));
  const toggle = (product: Product) =>
    setSaid(said.includes(product) ? said.filter((each) => each !== product) : [...said, product]);
  return (
    <>
      <p className="text-body text-ink-2">{t('lead')}</p>
      <ul className="mt-2 flex flex-wrap gap-2">
        {products.map((product) => (
          <li key={product}>
            <button
              type="button"
              aria-pressed={said.includes(product)}
              className="min-h-11 cursor-pointer rounded border-control border-ink bg-paper-lift px-3 text-left text-body aria-pressed:bg-ink aria-pressed:font-strong aria-pressed:text-on-ink"
              onClick={() => toggle(product)}
            >
              {t(`product.${product}`)}
            </button>
          </li>
        ))}
      </ul>
      <div role="status" className="mt-3">
        {toBuy.length === 0 ? (
          <p className="text-body font-strong">{t('buyNothing')}</p>
        ) : (
          <>
            {said.length > 0 && ofTheSlip.length === 0 ? (
              <p className="text-body font-strong">{t('buyNothingOf')}</p>
            ) : null}
            <p className="text-body font-strong">
              {t('needs', {
                list: toBuy.map((each) => `${t(`product.${each.substance}`)}, ${taken(each)}`).join('; '),
              })}
            </p>
          </>
        )}
        <ul className="mt-2">
          {products
            .filter((product) => said.includes(product))
            .map((product) => (
              <li key={product} className="border-t border-rule py-2 text-body">
                <Answer product={product} purchases={purchases} />
              </li>
            ))}
        </ul>
      </div>
    </>
  );
}

function Answer({ product, purchases }: { product: Product; purchases: readonly Purchase[] }) {
  const t = useTranslations('house.shop');
  const common = useTranslations('common');
  const answer = useAnswer();
  const purchase = purchases.find(({ substance }) => substance === product);
  if (purchase === undefined && isKeptAway(product))
    return (
      <Callout severity="take-care" word={common('takeCare')} title={t(`product.${product}`)}>
        <p>
          {t('keepAway')} {t(`why.${product}`)}
        </p>
      </Callout>
    );
  return purchase === undefined
    ? null
    : t.rich('of', { product: t(`product.${product}`), answer: answer(purchase), b: bold });
}

function isKeptAway(product: Product): product is KeptAway {
  return keptAway.some((each) => each === product);
}

function useAmounts() {
  const t = useTranslations('house.shop');
  const { amount } = useUnits();
  return {
    taken: ({ needed, tablets, unit }: Purchase) =>
      tablets > 0 ? t('tablets', { count: tablets }) : amount(needed, unit),
    held: ({ inStock, unit }: Purchase) => amount(inStock, unit),
  };
}

function useAnswer(): (purchase: Purchase) => string {
  const t = useTranslations('house.shop');
  const { taken, held } = useAmounts();
  return (purchase) => {
    const figures = { needed: taken(purchase), inStock: held(purchase) };
    switch (purchase.answer) {
      case 'needed':
        return purchase.inStock === 0 ? t('neededNone', figures) : t('needed', figures);
      case 'have-enough':
        return t('haveEnough', figures);
      case 'not-this-week': {
        const said = t('notThisWeek', { stock: purchase.inStock === 0 ? 'none' : held(purchase) });
        return purchase.testFirst ? `${said} ${t('testFirst')}` : said;
      }
    }
  };
}
