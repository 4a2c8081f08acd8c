'use client';

import { useMutation } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useId } from 'react';
import { FileInput } from '@/components/ui/inputs';
import { Notice } from '@/components/ui/notice';
import { SectionTitle } from '@/components/ui/page-title';
import { ApiProblem, api, uploadFile } from '@/lib/http/api-client';

/** The photograph of the plate on the machine: what the serial number was read from. */
export function NameplatePhoto(props: { machineId: string; fileId: string | null; changes: boolean }) {
  const { machineId, fileId, changes } = props;
  const router = useRouter();
  const inputId = useId();
  const upload = useMutation({
    mutationFn: async (file: File) =>
      api(`/api/machines/${machineId}/nameplate`, {
        method: 'PUT',
        body: { fileId: await uploadFile('nameplate', file) },
      }),
    onSuccess: () => router.refresh(),
  });
  return (
    <>
      <SectionTitle>Nameplate</SectionTitle>
      {fileId && (
        <img src={`/api/files/${fileId}`} alt="The machine’s nameplate" className="mb-3 w-full border border-line" />
      )}
      {changes && (
        <>
          <label htmlFor={inputId} className="block font-medium">
            {fileId ? 'Another photo of the nameplate' : 'Photo of the nameplate'}
          </label>
          <p className="text-sm text-ink2">JPEG, PNG or WebP, up to 15 MB</p>
          <FileInput
            id={inputId}
            accept="image/jpeg,image/png,image/webp"
            capture="environment"
            disabled={upload.isPending}
            onChange={(event) => event.target.files?.[0] && upload.mutate(event.target.files[0])}
            className="mt-1"
          />
          {upload.isPending && <p>Sending the picture</p>}
          {upload.error instanceof ApiProblem && (
            <Notice tone="oxide" title={upload.error.title}>
              {upload.error.detail}
            </Notice>
          )}
        </>
      )}
    </>
  );
}
