import {
  createContext,
  useCallback,
  useContext,
  useEffect,
  useMemo,
  useState,
  type ReactNode,
} from 'react';

interface ShownFields {
  /** Names of the fields that are on the screen now, each with a place for its findings. */
  shown: ReadonlySet<string>;
  add: (name: string) => void;
  remove: (name: string) => void;
}

const ShownFieldsContext = createContext<ShownFields | undefined>(undefined);

/** Knows which fields a section shows; findings about any other are shown at its foot. */
export function ShownFieldsProvider({ children }: { children: ReactNode }) {
  const [shown, setShown] = useState<ReadonlySet<string>>(new Set());
  const add = useCallback((name: string) => {
    setShown((before) => new Set(before).add(name));
  }, []);
  const remove = useCallback((name: string) => {
    setShown((before) => new Set([...before].filter((each) => each !== name)));
  }, []);
  const value = useMemo(() => ({ shown, add, remove }), [shown, add, remove]);
  return <ShownFieldsContext value={value}>{children}</ShownFieldsContext>;
}

export function useShowField(name: string): void {
  const fields = useContext(ShownFieldsContext);
  const add = fields?.add;
  const remove = fields?.remove;
  useEffect(() => {
    add?.(name);
    return () => remove?.(name);
  }, [name, add, remove]);
}

const NONE: ReadonlySet<string> = new Set();

export function useShownFields(): ReadonlySet<string> {
  return useContext(ShownFieldsContext)?.shown ?? NONE;
}
