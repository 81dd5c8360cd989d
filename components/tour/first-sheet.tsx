'use client';

import dynamic from 'next/dynamic';
import { untilFetched } from '@/components/ui/until-fetched';

/** Only fetched by whoever sees it: once in the life of an account. */
export const FirstSheetTour = dynamic(() => untilFetched(() => import('./tour')).then(({ Tour }) => Tour));
