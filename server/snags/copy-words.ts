import type { SnagMender } from '@/lib/contracts/snags';

type CopyWords = {
  title: string;
  fileName: string;
  openSnags: (count: number) => string;
  by: (date: string) => string;
  takenBy: (name: string) => string;
  record: (id: string, isUntouched: boolean) => string;
  menders: Record<SnagMender, string>;
};

/** The signed copy in the customer's language. The Spanish is recalled; see DEVELOPERS.md. */
export const copyWords: Record<'en' | 'es', CopyWords> = {
  en: {
    title: 'Sign-off',
    fileName: 'sign-off.pdf',
    openSnags: (count) =>
      count === 0
        ? 'Nothing was open when this was signed.'
        : `Still open when this was signed: ${count}`,
    by: (date) => `by ${date}`,
    takenBy: (name) => `Taken on site by ${name}.`,
    record: (id, isUntouched) =>
      isUntouched
        ? `Record ${id}, unchanged since it was signed. Snags found later stand apart.`
        : `Record ${id}: THIS RECORD WAS CHANGED AFTER IT WAS SIGNED.`,
    menders: {
      crew: 'mended by our crew',
      bench: 'made anew in our shop',
      supplier: 'ordered from the supplier',
      'other-trade': 'for another trade',
      customer: 'with you',
    },
  },
  es: {
    title: 'Conformidad',
    fileName: 'conformidad.pdf',
    openSnags: (count) =>
      count === 0 ? 'Nada quedó pendiente al firmar.' : `Pendiente al firmar: ${count}`,
    by: (date) => `para el ${date}`,
    takenBy: (name) => `Recibido en el sitio por ${name}.`,
    record: (id, isUntouched) =>
      isUntouched
        ? `Registro ${id}, sin cambios desde la firma. Lo que se encuentre después va aparte.`
        : `Registro ${id}: ESTE REGISTRO FUE CAMBIADO DESPUÉS DE LA FIRMA.`,
    menders: {
      crew: 'lo arregla nuestro equipo',
      bench: 'se hace de nuevo en el taller',
      supplier: 'pedido al proveedor',
      'other-trade': 'para otro oficio',
      customer: 'de su parte',
    },
  },
};
