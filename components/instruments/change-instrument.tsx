'use client';

import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { type FormInstrument, InstrumentForm } from './instrument-form';

export function ChangeInstrument({ instrument, kinds }: { instrument: FormInstrument; kinds: string[] }) {
  const [open, setOpen] = useState(false);
  return (
    <>
      <Button small onClick={() => setOpen(true)}>
        Change
      </Button>
      <Dialog open={open} onOpenChange={setOpen} title={`Change ${instrument.number}`}>
        <InstrumentForm instrument={instrument} kinds={kinds} onDone={() => setOpen(false)} />
      </Dialog>
    </>
  );
}
