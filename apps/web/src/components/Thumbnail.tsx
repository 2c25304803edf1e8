import Box from '@mui/material/Box';
import { useEffect, useState } from 'react';

interface Props {
  id: string;
  load: (id: string) => Promise<Blob | null>;
  alt: string;
}

/** A stored picture, small; its memory is given back when it leaves the screen. */
export function Thumbnail({ id, load, alt }: Props) {
  const [address, setAddress] = useState<string | null>(null);
  useEffect(() => {
    let made: string | null = null;
    let alive = true;
    void load(id).then((blob) => {
      if (!alive || !blob) return;
      made = URL.createObjectURL(blob);
      setAddress(made);
    });
    return () => {
      alive = false;
      if (made) URL.revokeObjectURL(made);
    };
    // The loader reads by id; a new function with the same id shows the same picture.
    // eslint-disable-next-line react-hooks/exhaustive-deps
  }, [id]);
  return (
    <Box sx={{ aspectRatio: '4 / 3', bgcolor: 'divider', overflow: 'hidden' }}>
      {address && (
        <img src={address} alt={alt} style={{ width: '100%', height: '100%', objectFit: 'cover' }} />
      )}
    </Box>
  );
}
