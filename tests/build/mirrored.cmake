cmake_minimum_required(VERSION 3.25)
# Every source of a layer has a test of its name: core/parse.cpp, tests/core/parse_test.cpp. Sources that are tested only
# through others stand in unmirrored.txt; that list may shrink, and a line that is no longer true is an offence as well.
file(GLOB sources RELATIVE ${ROOT} ${ROOT}/core/*.cpp ${ROOT}/estimation/*.cpp ${ROOT}/stats/*.cpp
     ${ROOT}/cli/*.cpp)
list(REMOVE_ITEM sources cli/main.cpp)

set(excused "")
if(EXISTS ${ROOT}/tests/build/unmirrored.txt)
  file(STRINGS ${ROOT}/tests/build/unmirrored.txt excused)
endif()

set(offences "")
foreach(source IN LISTS sources)
  string(REGEX REPLACE "\\.cpp$" "_test.cpp" test tests/${source})
  if(EXISTS ${ROOT}/${test})
    if(source IN_LIST excused)
      list(APPEND offences "${source} has its test: take it off tests/build/unmirrored.txt")
    endif()
  elseif(NOT source IN_LIST excused)
    list(APPEND offences "${source} lacks ${test}")
  endif()
endforeach()
if(offences)
  list(JOIN offences "\n" offences)
  message(FATAL_ERROR "sources without a test:\n${offences}")
endif()
