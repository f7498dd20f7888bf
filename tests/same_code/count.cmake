# cmake -DOBJECT=... -DOBJDUMP=... -P count.cmake: `raw` and `typed_numbers` have equally many
# instructions.
foreach(function raw typed_numbers)
  execute_process(COMMAND ${OBJDUMP} -d --no-show-raw-insn --disassemble=${function} ${OBJECT}
                  OUTPUT_VARIABLE listing COMMAND_ERROR_IS_FATAL ANY)
  string(REGEX MATCHALL "\n +[0-9a-f]+:" lines "${listing}")
  list(LENGTH lines count_${function})
  message(STATUS "${function}: ${count_${function}} instructions")
endforeach()
if(count_raw LESS 10 OR NOT count_raw EQUAL count_typed_numbers)
  message(FATAL_ERROR "expected equally many, and more than a call")
endif()
