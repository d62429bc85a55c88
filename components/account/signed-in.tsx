import { useRouter } from 'expo-router';
import { useEffect, type ReactNode } from 'react';
import type { AccountAnswer } from '../../shared/account';
import { Failure } from '../ui/failure';
import { Notice } from '../ui/notice';
import { Skeleton } from '../ui/skeleton';
import { useOnline } from '../ui/use-online';
import { rememberAddress } from './return-address';
import { whoOf } from './session';
import { useSession } from './session-queries';

interface SignedInProps {
  readonly children: (who: AccountAnswer) => ReactNode;
  /** Puts what stands here until it is known, or why it is not, in the place's page. */
  readonly otherwise: (answer: ReactNode) => ReactNode;
}

/**
 * What only people who are signed in see. Nothing is decided before it is known who is here;
 * nobody is led to the sign-in page and back; who was here until now keeps what is on screen.
 */
export function SignedIn({ children, otherwise }: SignedInProps) {
  const { data: session, error, refetch } = useSession();
  const online = useOnline();
  const router = useRouter();
  const isNobody = session?.state === 'nobody';
  useEffect(() => {
    if (!isNobody) return;
    rememberAddress();
    router.replace('/sign-in');
  }, [isNobody, router]);

  const who = whoOf(session);
  if (who) return children(who);
  return otherwise(
    error ? (
      <Failure error={error} onRetry={() => void refetch()} />
    ) : online ? (
      <Skeleton label="Looking who is signed in" />
    ) : (
      <Notice tone="warn" title="You are offline">
        This page needs the service. It comes when the connection is back.
      </Notice>
    ),
  );
}
