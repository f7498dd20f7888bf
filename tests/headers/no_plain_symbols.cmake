# A translation unit that only includes our headers defines nothing of ours: each function is
# inline or constexpr and no object is initialised at start-up.
cmake_minimum_required(VERSION 3.22)
execute_process(COMMAND ${NM} -C --defined-only ${OBJECT} OUTPUT_VARIABLE symbols
                RESULT_VARIABLE result)
if(NOT result EQUAL 0)
  message(FATAL_ERROR "${NM} cannot read ${OBJECT}")
endif()
if(NOT symbols MATCHES "T in_forward_order")
  message(FATAL_ERROR "the function that proves this check sees symbols is missing:\n${symbols}")
endif()
string(REGEX MATCHALL "[^\n]* [TtBbDdCSsG] [^\n]*convelope[^\n]*" found "${symbols}")
string(REGEX MATCHALL "[^\n]*std::__ioinit[^\n]*" stream_objects "${symbols}")
if(found OR stream_objects)
  list(JOIN found "\n  " text)
  message(FATAL_ERROR "defined by including the headers:\n  ${text}\n  ${stream_objects}")
endif()
