'use client';

import { useMutation, useQuery, useQueryClient } from '@tanstack/react-query';
import { useId, useState } from 'react';
import { Button } from '@/components/ui/button';
import { Field } from '@/components/ui/field';
import { FileInput, Select, TextInput } from '@/components/ui/inputs';
import { Notice } from '@/components/ui/notice';
import { ApiProblem, api, uploadFile } from '@/lib/http/api-client';
import { mostPhotos } from '@/lib/schemas/sheet-photo';
import type { Layout } from '@/standards/types';

interface Photo {
  id: string;
  item: string | null;
  caption: string;
  fileId: string;
  addedBy: string;
}

/** Photographs at a sheet, each with a line of words; at a function check they may belong to one of its items. They print. */
export function SheetPhotos(props: { sheetId: string; layout: Layout; readOnly: boolean }) {
  const { sheetId, layout, readOnly } = props;
  const headingId = useId();
  const cache = useQueryClient();
  const path = `/api/sheets/${sheetId}/photos`;
  const photos = useQuery({
    queryKey: ['sheet-photos', sheetId],
    queryFn: async () => (await api<{ items: Photo[] }>(path)).data.items,
  });
  const again = () => cache.invalidateQueries({ queryKey: ['sheet-photos', sheetId] });
  const remove = useMutation({
    mutationFn: (id: string) => api(`${path}/${id}`, { method: 'DELETE' }),
    onSettled: again,
  });
  const items = layout.kind === 'check-list' ? layout.items : [];
  const wordsOf = (item: string | null) => items.find(({ id }) => id === item)?.question ?? null;
  const there = photos.data ?? [];
  return (
    <section className="mt-4" aria-labelledby={headingId}>
      <h3 id={headingId} className="font-semibold">
        Photos
      </h3>
      {photos.error && <p className="text-ink2">The photos cannot be shown without the server.</p>}
      <ul className="grid gap-3 sm:grid-cols-2">
        {there.map((photo, index) => (
          <li key={photo.id} className="border border-line p-2">
            <img
              src={`/api/files/${photo.fileId}`}
              alt={photo.caption || wordsOf(photo.item) || `Photo ${index + 1}`}
              className="max-h-64 w-full object-contain"
            />
            <p className="mt-1 text-[15px]">
              {[wordsOf(photo.item), photo.caption].filter(Boolean).join(' · ')}{' '}
              <span className="text-ink2">by {photo.addedBy}</span>
            </p>
            {!readOnly && (
              <Button variant="quiet" disabled={remove.isPending} onClick={() => remove.mutate(photo.id)}>
                Take photo {index + 1} away
              </Button>
            )}
          </li>
        ))}
      </ul>
      <Problem error={remove.error} />
      {!readOnly && there.length < mostPhotos && <AddPhoto path={path} items={items} onAdded={again} />}
    </section>
  );
}

function AddPhoto(props: { path: string; items: { id: string; question: string }[]; onAdded: () => void }) {
  const { path, items, onAdded } = props;
  const [file, setFile] = useState<File | null>(null);
  const [caption, setCaption] = useState('');
  const [item, setItem] = useState('');
  const [round, setRound] = useState(0);
  const add = useMutation({
    mutationFn: async (chosen: File) =>
      api(path, { method: 'POST', body: { fileId: await uploadFile('photo', chosen), caption, item: item || null } }),
    onSuccess: () => {
      setFile(null);
      setCaption('');
      setItem('');
      setRound((before) => before + 1);
      onAdded();
    },
  });
  return (
    <div className="mt-2 grid gap-2">
      <Field label="Add a photo" hint="JPEG, PNG or WebP, up to 15 MB">
        <FileInput
          key={round}
          accept="image/jpeg,image/png,image/webp"
          capture="environment"
          onChange={(event) => setFile(event.target.files?.[0] ?? null)}
        />
      </Field>
      {file && (
        <>
          {items.length > 0 && (
            <Field label="Belongs to" optional>
              <Select value={item} onChange={(event) => setItem(event.target.value)}>
                <option value="">the whole sheet</option>
                {items.map(({ id, question }) => (
                  <option key={id} value={id}>
                    {question}
                  </option>
                ))}
              </Select>
            </Field>
          )}
          <Field label="What it shows, prints below it" optional>
            <TextInput value={caption} maxLength={200} onChange={(event) => setCaption(event.target.value)} />
          </Field>
          <div>
            <Button disabled={add.isPending} onClick={() => add.mutate(file)}>
              {add.isPending ? 'Sending the photo' : 'Add this photo'}
            </Button>
          </div>
        </>
      )}
      <Problem error={add.error} />
    </div>
  );
}

function Problem({ error }: { error: Error | null }) {
  if (!(error instanceof ApiProblem)) return null;
  return (
    <Notice tone="oxide" title={error.title}>
      {error.detail} {error.status === 0 && 'The photo is still chosen: try again when the network is back.'}
    </Notice>
  );
}
