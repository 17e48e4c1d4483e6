import { queryOptions, useMutation, useQueryClient } from '@tanstack/react-query';
import type {
  ApproveInstructionRequest,
  ChangeInstructionRequest,
  DraftInstructionRequest,
  DropInstructionRequest,
  Instruction,
  InstructionList,
} from '#shared/contracts/instruction.ts';
import { http } from '#src/lib/http.ts';

/** Every revision of the work instruction, newest first. */
export const instructionsQuery = queryOptions({
  queryKey: ['instructions'],
  queryFn: () => http.get<InstructionList>('/api/instructions'),
});

/** One revision of the work instruction. */
export const instructionQuery = (id: string) =>
  queryOptions({
    queryKey: ['instructions', id],
    queryFn: () => http.get<Instruction>(`/api/instructions/${id}`),
  });

const useInstructionChange = <Request>(send: (request: Request) => Promise<Instruction>) => {
  const client = useQueryClient();
  return useMutation({
    mutationFn: send,
    onSuccess: (instruction) => {
      client.setQueryData(instructionQuery(instruction.id).queryKey, instruction);
      return client.invalidateQueries({ queryKey: instructionsQuery.queryKey, exact: true });
    },
  });
};

/** Drafts a new revision that begins as another one stands. */
export const useDraftInstruction = () =>
  useInstructionChange((request: DraftInstructionRequest) =>
    http.post<Instruction>('/api/instructions', request),
  );

/** Changes a draft. */
export const useChangeInstruction = (id: string) =>
  useInstructionChange((request: ChangeInstructionRequest) =>
    http.patch<Instruction>(`/api/instructions/${id}`, request),
  );

/** Drops a draft. */
export const useDropInstruction = (id: string) =>
  useInstructionChange((request: DropInstructionRequest) =>
    http.post<Instruction>(`/api/instructions/${id}/drop`, request),
  );

/** Approves a draft. */
export const useApproveInstruction = (id: string) =>
  useInstructionChange((request: ApproveInstructionRequest) =>
    http.post<Instruction>(`/api/instructions/${id}/approve`, request),
  );
