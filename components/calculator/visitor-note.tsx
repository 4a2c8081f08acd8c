import { Notice } from '@/components/ui/notice';

export function VisitorNote() {
  return (
    <Notice title="Before you rely on it" className="mt-4 max-w-3xl text-[15px]">
      <ul className="list-disc pl-5">
        <li>
          It runs in your browser. Nothing that you type is sent or stored unless you send it as a request yourself.
        </li>
        <li>A request is answered and forgotten; of one address about four a second are answered.</li>
        <li>A figure replaces no inspection: whoever measures answers for readings, tolerance and verdict.</li>
      </ul>
    </Notice>
  );
}
