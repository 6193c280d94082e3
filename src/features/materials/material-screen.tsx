import { useQuery } from '@tanstack/react-query';
import { useLocalSearchParams } from 'expo-router';
import { useState } from 'react';
import { isApiError } from '../../api/api-error';
import { describeError } from '../../api/describe-error';
import { keptThingsQueries } from '../../api/kept-things-queries';
import { hasRole, useAccount, useHasDraft } from '../../session';
import { Disclosure, Screen } from '../../ui';
import { FetchedScreen } from '../../ui/fetched-screen';
import { ReadingOnly } from '../../ui/form/reading-only';
import { MaterialFacts } from './components/material-facts';
import { MaterialRevisions } from './components/material-revisions';
import { MaterialForm } from './material-form';

/** A new material. */
export function NewMaterialScreen() {
  const account = useAccount();
  const { return: returnTo } = useLocalSearchParams<{ return?: string }>();
  return (
    <Screen title="New material" back={{ href: `${account.basePath}/materials`, label: 'Materials' }}>
      {hasRole(account, ['engineer']) ? (
        <MaterialForm opened={null} returnTo={returnTo} onTheirsTaken={() => undefined} />
      ) : (
        <ReadingOnly what="materials" />
      )}
    </Screen>
  );
}

/** One material; changing it is the same page. */
export function MaterialScreen() {
  const account = useAccount();
  const { material: id } = useLocalSearchParams<{ material: string }>();
  const material = useQuery(keptThingsQueries(account.id, 'materials').one(id));
  const hasDraft = useHasDraft(`materials/${id}`);
  const [timesTaken, setTimesTaken] = useState(0);
  const back = { href: `${account.basePath}/materials`, label: 'Materials' };
  return (
    <FetchedScreen
      title="Material"
      back={back}
      fetched={material}
      isMissing={isApiError(material.error, 'not_found')}
      failure={describeError(material.error, 'The material could not be fetched')}
    >
      {(opened) => (
        <Screen
          title={opened.revision.spec.name}
          subtitle={`${opened.revision.spec.material_class}, ${opened.revision.spec.kind}; revision ${opened.revision.number}`}
          back={back}
        >
          {hasRole(account, ['engineer']) ? null : <ReadingOnly what="materials" />}
          <MaterialFacts spec={opened.revision.spec} />
          <MaterialRevisions materialId={opened.id} />
          {hasRole(account, ['engineer']) ? (
            <Disclosure key={opened.id} label="Change it: a new revision" isOpenAtFirst={hasDraft}>
              <MaterialForm
                key={`${opened.id} ${timesTaken}`}
                opened={opened}
                returnTo={undefined}
                onTheirsTaken={() => setTimesTaken(timesTaken + 1)}
              />
            </Disclosure>
          ) : null}
        </Screen>
      )}
    </FetchedScreen>
  );
}
