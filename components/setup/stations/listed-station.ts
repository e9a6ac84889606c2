/** A station as the screens of Set-up know it; times as ISO text. */
export interface ListedStation {
  id: number;
  name: string;
  zone: string;
  longitudeDeg: number;
  latitudeDeg: number;
  heightM: number;
  isActive: boolean;
}

export interface StationNow extends ListedStation {
  observedAt: string | null;
  pavementTempC: number | null;
  airTempC: number | null;
  dewPointC: number | null;
  windSpeedMPerS: number | null;
  surfaceStatus: string | null;
  flaggedCount: number;
  flags: Readonly<Record<string, readonly string[]>> | null;
  hasMapping: boolean;
}

export interface ListedUpload {
  id: number;
  fileName: string;
  source: 'screen' | 'script';
  sentBy: string;
  finishedAt: string;
  rowsRead: number;
  rowsAdded: number;
  rowsFilled: number;
  rowsUnchanged: number;
  rowsRejected: number;
  rowsFlagged: number;
}

export interface ListedKey {
  id: number;
  hint: string;
  issuedAt: string;
  issuedByName: string;
  revokedAt: string | null;
  lastUsedAt: string | null;
}
