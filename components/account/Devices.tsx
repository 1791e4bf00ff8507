import { useQuery } from '@tanstack/react-query';
import { useState } from 'react';
import { View } from 'react-native';
import { dateTimeText } from '@/shared/format';
import { isProblem } from '../api/ApiProblem';
import { canKeepKey } from '../api/deviceKey';
import { useUser } from '../api/session';
import { deviceZone } from '../home/clock';
import { useLocale } from '../i18n/preferences';
import { useMessages } from '../i18n/useMessages';
import { space } from '../theme/tokens';
import {
  Button,
  describeFault,
  ErrorSummary,
  PinField,
  Section,
  Text,
  TextField,
  type FieldFault,
} from '../ui';
import { devicesQuery, thisDeviceQuery, useAddDevice, useTakeOffDevice } from './accountQueries';
import { deviceName } from './deviceName';
import { LineWithAction } from './LineWithAction';

function AddForm({ onClose }: { onClose: () => void }) {
  const user = useUser();
  const messages = useMessages();
  const { account, problems } = messages;
  const add = useAddDevice(user.id);
  const [label, setLabel] = useState(() => deviceName(navigator.userAgent ?? '', account));
  const [pin, setPin] = useState('');
  const [tried, setTried] = useState(false);

  const labelError = tried && label.trim() === '' ? account.deviceLabelMissing : undefined;
  const wrongPin = isProblem(add.error, 'wrong-pin') ? problems['wrong-pin'].title : undefined;
  const pinError = tried ? (pin.length === 6 ? wrongPin : account.pinShort) : undefined;
  const faults: FieldFault[] = [];
  if (labelError !== undefined) faults.push({ id: 'device-label', message: labelError });
  if (pinError !== undefined) faults.push({ id: 'device-pin', message: pinError });
  if (add.isError && faults.length === 0)
    faults.push({ message: describeFault(add.error, messages) });

  function handleAdd() {
    setTried(true);
    if (label.trim() === '' || pin.length !== 6) return;
    add.mutate({ label: label.trim(), pin }, { onSuccess: onClose });
  }

  return (
    <View style={{ gap: space.md }}>
      {tried && !add.isPending && <ErrorSummary faults={faults} />}
      <TextField
        id="device-label"
        label={account.deviceLabel}
        value={label}
        onChangeText={setLabel}
        error={labelError}
        maxLength={200}
      />
      <PinField id="device-pin" value={pin} onChange={setPin} error={pinError} />
      <Button kind="primary" label={account.addDevice} onPress={handleAdd} busy={add.isPending} />
      <Button label={account.cancel} onPress={onClose} />
    </View>
  );
}

/** Devices whose key may sign where there is no signal. */
export function Devices() {
  const user = useUser();
  const messages = useMessages();
  const { account } = messages;
  const locale = useLocale();
  const devices = useQuery(devicesQuery());
  const here = useQuery(thisDeviceQuery(user.id));
  const takeOff = useTakeOffDevice(user.id);
  const [adding, setAdding] = useState(false);
  const items = (devices.data?.items ?? []).filter((device) => !device.revoked);
  const added = items.some((device) => device.id === here.data);

  return (
    <Section id="devices" title={account.devices}>
      <Text color="ink2">{account.devicesBody}</Text>
      {devices.isError && devices.data === undefined && (
        <Text>{describeFault(devices.error, messages)}</Text>
      )}
      {takeOff.isError && <Text variant="strong">{describeFault(takeOff.error, messages)}</Text>}
      <View role="list">
        {items.map((device) => (
          <LineWithAction
            key={device.id}
            title={
              device.id === here.data ? `${device.label}, ${account.thisDevice}` : device.label
            }
            note={
              device.lastUsedAt === null
                ? account.deviceNotUsed
                : account.deviceUsed(dateTimeText(locale, device.lastUsedAt, deviceZone()))
            }
            action={{
              label: account.takeOff,
              'aria-label': account.takeOffOf(device.label),
              onPress: () => takeOff.mutate(device.id),
            }}
          />
        ))}
      </View>
      {adding && <AddForm onClose={() => setAdding(false)} />}
      {!adding && !added && (
        <Button
          icon="lock"
          label={account.addDevice}
          onPress={() => setAdding(true)}
          reason={!canKeepKey() ? account.deviceUnable : !user.hasPin ? account.noPin : undefined}
        />
      )}
    </Section>
  );
}
