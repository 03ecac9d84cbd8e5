import { redirect } from 'next/navigation';
import { Beam } from '@/components/charts/beam';
import { Caution } from '@/components/charts/caution';
import { ButtonLink } from '@/components/ui/button';
import { sessionUser } from '@/lib/web/session';

/** Who is signed in goes on to the passages; whoever is not reads what this is. */
export default async function HomePage() {
  if (await sessionUser()) redirect('/passages');
  return (
    <div className="grid gap-10 md:grid-cols-[3fr_2fr] md:items-center">
      <div>
        <h1 className="text-3xl leading-tight font-bold md:text-5xl">
          She keeps her ama to windward. Can she keep it down?
        </h1>
        <p className="mt-5 text-lg">
          Twobow is for people who sail small shunting craft. Put in what your boat weighs and where, and the wind you
          carry each reef up to. Draw a coastal passage and give the forecast: leg by leg you read which end leads, how
          many shunts it takes, which reef is called and by when, and whether heeling moment beats righting moment.
        </p>
        <div className="mt-8 flex flex-wrap gap-3">
          <ButtonLink href="/sign-in">Sign in</ButtonLink>
          <ButtonLink href="/register" variant="plain">
            Register
          </ButtonLink>
        </div>
      </div>
      <figure className="border-line bg-panel border p-5">
        <Beam rightingNm={3198} heelingNm={1439} loadShare={0.45} workingMargin={1.5} size="large" />
        <figcaption className="text-muted mt-3 text-sm">
          The beam: righting moment on the left, heeling moment in the gust on the right, to one scale. An invented boat
          in 13 kn of gust. It tips once your working margin is used up.
        </figcaption>
        <div className="mt-3">
          <Caution />
        </div>
      </figure>
    </div>
  );
}
