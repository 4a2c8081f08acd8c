import Link from 'next/link';
import { allGuides } from '@/lib/explaining/methods/all-guides';
import { guideGroups } from '@/lib/explaining/methods/method-guide';

/** Every method with a sentence, by what it is for. `base`: where its pages stand. */
export function MethodList({ base }: { base: string }) {
  return (
    <>
      {Object.entries(guideGroups).map(([group, title]) => (
        <section key={group} aria-labelledby={`group-${group}`}>
          <h2 id={`group-${group}`} className="mb-1 mt-7 border-b-[1.5px] border-ink pb-1 text-lg font-semibold">
            {title}
          </h2>
          <ul>
            {allGuides
              .filter((guide) => guide.group === group)
              .map(({ slug, title: name, sentence }) => (
                <li key={slug} className="border-b border-hair">
                  <Link href={`${base}/${slug}`} className="block py-2.5 hover:bg-blue-wash">
                    <span className="font-medium text-blue underline">{name}</span>
                    <span className="block text-[15px] text-ink2">{sentence}</span>
                  </Link>
                </li>
              ))}
          </ul>
        </section>
      ))}
    </>
  );
}
